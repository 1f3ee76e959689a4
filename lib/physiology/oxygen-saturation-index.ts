import { requireCharted } from "./require-charted";
import { wholePercent } from "./whole-percent";

/**
 * Oxygen saturation index: FiO2 × mean airway pressure × 100 / SpO2.
 * @param input.fio2 fraction, 0.21 to 1
 * @param input.meanAirwayPressureCmH2O 0 to 80
 * @param input.spo2Percent 30 to 100
 * @throws RangeError outside these
 * @source DesPrez, Chest 2017;152:1151
 * @example oxygenSaturationIndex({ fio2: 0.5, meanAirwayPressureCmH2O: 12, spo2Percent: 96 }) //=> 6.25
 */
export function oxygenSaturationIndex(input: {
  fio2: number;
  meanAirwayPressureCmH2O: number;
  spo2Percent: number;
}): number {
  const meanCmH2O = requireCharted("meanAirwayPressureCmH2O", input.meanAirwayPressureCmH2O);
  return (wholePercent(input.fio2) * meanCmH2O) / requireCharted("spo2Percent", input.spo2Percent);
}
