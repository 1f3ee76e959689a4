import { derivedRanges } from "./derived-ranges";
import { chartedRanges, isRefused } from "./limits";
import { requireInRange } from "./require-in-range";

/**
 * Exhaled volume for each kilogram of predicted body weight (mL/kg). Unlike a set volume it may be exactly 0:
 * disconnected, or no breath.
 * @param input.exhaledTidalVolumeMl 10 to 2000, or 0
 * @param input.pbwKg 16 to 139
 * @throws RangeError outside these
 * @source ARDS Network, N Engl J Med 2000;342:1301
 * @example exhaledVolumePerKg({ exhaledTidalVolumeMl: 350, pbwKg: 70 }) //=> 5
 */
export function exhaledVolumePerKg(input: { exhaledTidalVolumeMl: number; pbwKg: number }): number {
  const pbwKg = requireInRange("pbwKg", input.pbwKg, derivedRanges.pbwKg);
  const { exhaledTidalVolumeMl: volumeMl } = input;
  if (isRefused("exhaledTidalVolumeMl", volumeMl)) {
    const { refuse } = chartedRanges.exhaledTidalVolumeMl;
    return requireInRange("exhaledTidalVolumeMl", volumeMl, refuse, "tidalVolumeMl");
  }
  return volumeMl / pbwKg;
}
