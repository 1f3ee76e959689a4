import { alveolarPo2MmHg, type AlveolarGas } from "./alveolar-po2-mm-hg";
import { requireCharted } from "./require-charted";

/**
 * Alveolar–arterial oxygen difference (mmHg), short form of alveolar PO2. No normal value is given above room air.
 * A little below 0 is measuring error.
 * @param input as for `alveolarPo2MmHg`, and `pao2MmHg` 10 to 700
 * @throws RangeError outside these
 * @source standard physiology, as in the Merck Manual's table
 * @example alveolarArterialGradientMmHg({ fio2: 0.6, paco2MmHg: 45, barometricPressureMmHg: 760, respiratoryQuotient: 0.8, pao2MmHg: 80 }) //=> 291.55
 */
export function alveolarArterialGradientMmHg(input: AlveolarGas & { pao2MmHg: number }): number {
  return alveolarPo2MmHg(input) - requireCharted("pao2MmHg", input.pao2MmHg);
}
