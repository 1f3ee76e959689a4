import { derivedRanges } from "./derived-ranges";
import { requireInRange } from "./require-in-range";

const seaLevelMmHg = 760;

/**
 * P/F as it would compare at sea level: P/F × 760 / barometric pressure, the trials' direction (thresholds scaled by
 * Pbar / 760). The footnote printed with the Berlin table runs the other way and is not used.
 * @param input.pfRatio 10 to 3334
 * @param input.barometricPressureMmHg 400 to 800
 * @throws RangeError outside these
 * @source ARDS Network; ARDS Definition Task Force, reply, JAMA 2012;308:1321
 * @example altitudeAdjustedPf({ pfRatio: 132, barometricPressureMmHg: 570 }) //=> 176
 */
export function altitudeAdjustedPf(input: { pfRatio: number; barometricPressureMmHg: number }): number {
  const { pfRatio, barometricPressureMmHg } = input;
  requireInRange("barometricPressureMmHg", barometricPressureMmHg, derivedRanges.barometricPressureMmHg);
  return (requireInRange("pfRatio", pfRatio, derivedRanges.pfRatio) * seaLevelMmHg) / barometricPressureMmHg;
}
