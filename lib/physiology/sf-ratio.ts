import { requireCharted } from "./require-charted";
import { wholePercent } from "./whole-percent";

/**
 * SpO2 / FiO2. Usable for severity only where SpO2 is 97 % or less.
 * @param input.spo2Percent 30 to 100
 * @param input.fio2 fraction, 0.21 to 1
 * @throws RangeError outside these
 * @source Rice, Chest 2007;132:410; Matthay, Am J Respir Crit Care Med 2024;209:37
 * @example sfRatio({ spo2Percent: 94, fio2: 0.4 }) //=> 235
 */
export function sfRatio(input: { spo2Percent: number; fio2: number }): number {
  return (requireCharted("spo2Percent", input.spo2Percent) * 100) / wholePercent(input.fio2);
}
