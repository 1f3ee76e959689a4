import { derivedRanges } from "./derived-ranges";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";

/**
 * Minute volume (L/min): tidal volume times rate.
 * @param input.tidalVolumeMl 20 to 2000
 * @param input.respiratoryRate 1 to 150, the total rate
 * @throws RangeError outside these
 * @source definition
 * @example minuteVolumeLPerMin({ tidalVolumeMl: 420, respiratoryRate: 20 }) //=> 8.4
 */
export function minuteVolumeLPerMin(input: { tidalVolumeMl: number; respiratoryRate: number }): number {
  const tidalVolumeMl = requireCharted("tidalVolumeMl", input.tidalVolumeMl);
  const respiratoryRate = requireInRange("respiratoryRate", input.respiratoryRate, derivedRanges.respiratoryRate);
  return (tidalVolumeMl * respiratoryRate) / 1000;
}
