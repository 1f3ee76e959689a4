import { derivedRanges } from "./derived-ranges";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";

/**
 * Rapid shallow breathing index (breaths/min/L): rate over tidal volume. Valid without support, over one minute.
 * @param input.respiratoryRate 1 to 150
 * @param input.tidalVolumeMl 20 to 2000
 * @throws RangeError outside these
 * @source Yang and Tobin, N Engl J Med 1991;324:1445
 * @example rapidShallowBreathingIndex({ respiratoryRate: 30, tidalVolumeMl: 250 }) //=> 120
 */
export function rapidShallowBreathingIndex(input: { respiratoryRate: number; tidalVolumeMl: number }): number {
  const rate = requireInRange("respiratoryRate", input.respiratoryRate, derivedRanges.respiratoryRate);
  return (rate * 1000) / requireCharted("tidalVolumeMl", input.tidalVolumeMl);
}
