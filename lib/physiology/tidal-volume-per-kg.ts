import { derivedRanges } from "./derived-ranges";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";

/**
 * Tidal volume for each kilogram of predicted body weight (mL/kg).
 * @param input.tidalVolumeMl 20 to 2000
 * @param input.pbwKg 16 to 139
 * @throws RangeError outside these
 * @source ARDS Network, N Engl J Med 2000;342:1301
 * @example tidalVolumePerKg({ tidalVolumeMl: 420, pbwKg: 70 }) //=> 6
 */
export function tidalVolumePerKg(input: { tidalVolumeMl: number; pbwKg: number }): number {
  const tidalVolumeMl = requireCharted("tidalVolumeMl", input.tidalVolumeMl);
  return tidalVolumeMl / requireInRange("pbwKg", input.pbwKg, derivedRanges.pbwKg);
}
