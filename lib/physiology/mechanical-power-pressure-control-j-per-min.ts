import { derivedRanges } from "./derived-ranges";
import { joulePerLitreCmH2O } from "./joule-per-litre-cm-h2o";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";

/**
 * Mechanical power in pressure control (J/min), simplified form: 0.098 × rate × VT (L) × (pressure above PEEP + PEEP).
 * It overstates where the rise time is long.
 * @param input.respiratoryRate 1 to 150, the total rate
 * @param input.tidalVolumeMl 20 to 2000
 * @param input.pressureAbovePeepCmH2O 1 to 80
 * @param input.peepCmH2O 0 to 50
 * @throws RangeError outside these
 * @source Becher, Intensive Care Med 2019;45:1321 (from memory)
 * @example mechanicalPowerPressureControlJPerMin({ respiratoryRate: 20, tidalVolumeMl: 450, pressureAbovePeepCmH2O: 15, peepCmH2O: 10 }) //=> 22.05
 */
export function mechanicalPowerPressureControlJPerMin(input: {
  respiratoryRate: number;
  tidalVolumeMl: number;
  pressureAbovePeepCmH2O: number;
  peepCmH2O: number;
}): number {
  const rate = requireInRange("respiratoryRate", input.respiratoryRate, derivedRanges.respiratoryRate);
  const volumeL = requireCharted("tidalVolumeMl", input.tidalVolumeMl) / 1000;
  const aboveCmH2O = requireCharted("pressureAbovePeepCmH2O", input.pressureAbovePeepCmH2O);
  return joulePerLitreCmH2O * rate * volumeL * (aboveCmH2O + requireCharted("peepCmH2O", input.peepCmH2O));
}
