import { derivedRanges } from "./derived-ranges";
import { drivingPressureCmH2O } from "./driving-pressure-cm-h2o";
import { joulePerLitreCmH2O } from "./joule-per-litre-cm-h2o";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";
import { requireNotBelow } from "./require-not-below";

/**
 * Mechanical power in volume control (J/min), simplified form: 0.098 × rate × VT (L) × (peak − ΔP / 2).
 * @param input.respiratoryRate 1 to 150, the total rate
 * @param input.tidalVolumeMl 20 to 2000
 * @param input.peakCmH2O 2 to 120, not below plateau
 * @param input.plateauCmH2O 2 to 100, above total PEEP
 * @param input.totalPeepCmH2O 0 to 60
 * @throws RangeError outside these
 * @source Gattinoni, Intensive Care Med 2016;42:1567
 * @example mechanicalPowerVolumeControlJPerMin({ respiratoryRate: 20, tidalVolumeMl: 450, peakCmH2O: 30, plateauCmH2O: 23, totalPeepCmH2O: 10 }) //=> 20.727
 */
export function mechanicalPowerVolumeControlJPerMin(input: {
  respiratoryRate: number;
  tidalVolumeMl: number;
  peakCmH2O: number;
  plateauCmH2O: number;
  totalPeepCmH2O: number;
}): number {
  const rate = requireInRange("respiratoryRate", input.respiratoryRate, derivedRanges.respiratoryRate);
  const volumeL = requireCharted("tidalVolumeMl", input.tidalVolumeMl) / 1000;
  const peakCmH2O = requireCharted("peakCmH2O", input.peakCmH2O);
  const drivingCmH2O = drivingPressureCmH2O(input);
  requireNotBelow({ name: "peakCmH2O", value: peakCmH2O }, { name: "plateauCmH2O", value: input.plateauCmH2O });
  return joulePerLitreCmH2O * rate * volumeL * (peakCmH2O - drivingCmH2O / 2);
}
