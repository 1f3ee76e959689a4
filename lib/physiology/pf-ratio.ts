import { requireCharted } from "./require-charted";
import { wholePercent } from "./whole-percent";

/**
 * PaO2 / FiO2 (mmHg), divided by integer percent so that a ratio on a band's edge is exact.
 * @param input.pao2MmHg 10 to 700
 * @param input.fio2 fraction, 0.21 to 1, running when the blood was drawn
 * @throws RangeError outside these
 * @source ARDS Definition Task Force, JAMA 2012;307:2526
 * @example pfRatio({ pao2MmHg: 56, fio2: 0.28 }) //=> 200
 */
export function pfRatio(input: { pao2MmHg: number; fio2: number }): number {
  return (requireCharted("pao2MmHg", input.pao2MmHg) * 100) / wholePercent(input.fio2);
}
