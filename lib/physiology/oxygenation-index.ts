import { requireCharted } from "./require-charted";
import { wholePercent } from "./whole-percent";

/**
 * Oxygenation index: FiO2 × mean airway pressure × 100 / PaO2.
 * @param input.fio2 fraction, 0.21 to 1
 * @param input.meanAirwayPressureCmH2O 0 to 80
 * @param input.pao2MmHg 10 to 700
 * @throws RangeError outside these
 * @source DesPrez, Chest 2017;152:1151
 * @example oxygenationIndex({ fio2: 0.6, meanAirwayPressureCmH2O: 15, pao2MmHg: 75 }) //=> 12
 */
export function oxygenationIndex(input: { fio2: number; meanAirwayPressureCmH2O: number; pao2MmHg: number }): number {
  const meanCmH2O = requireCharted("meanAirwayPressureCmH2O", input.meanAirwayPressureCmH2O);
  return (wholePercent(input.fio2) * meanCmH2O) / requireCharted("pao2MmHg", input.pao2MmHg);
}
