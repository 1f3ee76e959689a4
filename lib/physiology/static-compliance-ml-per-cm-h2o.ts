import { drivingPressureCmH2O } from "./driving-pressure-cm-h2o";
import { requireCharted } from "./require-charted";

/**
 * Static compliance of the respiratory system (mL/cmH2O): tidal volume over driving pressure, with total PEEP.
 * @param input.tidalVolumeMl 20 to 2000
 * @param input.plateauCmH2O 2 to 100, above total PEEP
 * @param input.totalPeepCmH2O 0 to 60
 * @throws RangeError outside these
 * @source standard physiology; Amato, N Engl J Med 2015;372:747
 * @example staticComplianceMlPerCmH2O({ tidalVolumeMl: 420, plateauCmH2O: 25, totalPeepCmH2O: 10 }) //=> 28
 */
export function staticComplianceMlPerCmH2O(input: {
  tidalVolumeMl: number;
  plateauCmH2O: number;
  totalPeepCmH2O: number;
}): number {
  return requireCharted("tidalVolumeMl", input.tidalVolumeMl) / drivingPressureCmH2O(input);
}
