import { derivedRanges } from "./derived-ranges";
import { requireInRange } from "./require-in-range";
import { sfRatio } from "./sf-ratio";

/**
 * ROX index: (SpO2 / FiO2) / respiratory rate. Made for pneumonia on high flow; not for intubated patients.
 * @param input.spo2Percent 30 to 100
 * @param input.fio2 fraction, 0.21 to 1
 * @param input.respiratoryRate 1 to 150
 * @throws RangeError outside these
 * @source Roca, Am J Respir Crit Care Med 2019;199:1368
 * @example roxIndex({ spo2Percent: 95, fio2: 0.5, respiratoryRate: 25 }) //=> 7.6
 */
export function roxIndex(input: { spo2Percent: number; fio2: number; respiratoryRate: number }): number {
  return sfRatio(input) / requireInRange("respiratoryRate", input.respiratoryRate, derivedRanges.respiratoryRate);
}
