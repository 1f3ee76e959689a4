import { derivedRanges } from "./derived-ranges";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";
import { wholePercent } from "./whole-percent";

/** Vapour pressure of water at 37 °C. */
const waterVapourMmHg = 47;

export interface AlveolarGas {
  fio2: number;
  paco2MmHg: number;
  barometricPressureMmHg: number;
  respiratoryQuotient?: number;
}

/**
 * Alveolar PO2 (mmHg), short form: FiO2 × (barometric pressure − 47) − PaCO2 / R. At FiO2 1.0 the full form reads
 * higher by PaCO2 / 4.
 * @param input.fio2 fraction, 0.21 to 1
 * @param input.paco2MmHg 8 to 250
 * @param input.barometricPressureMmHg 400 to 800
 * @param input.respiratoryQuotient 0.6 to 1.3, 0.8 where not given
 * @throws RangeError outside these, or where they leave no oxygen
 * @source standard physiology, as in the Merck Manual's table
 * @example alveolarPo2MmHg({ fio2: 0.6, paco2MmHg: 45, barometricPressureMmHg: 760, respiratoryQuotient: 0.8 }) //=> 371.55
 */
export function alveolarPo2MmHg(input: AlveolarGas): number {
  const { barometricPressureMmHg, respiratoryQuotient = 0.8 } = input;
  requireInRange("barometricPressureMmHg", barometricPressureMmHg, derivedRanges.barometricPressureMmHg);
  requireInRange("respiratoryQuotient", respiratoryQuotient, derivedRanges.respiratoryQuotient);
  const inspiredMmHg = (wholePercent(input.fio2) * (barometricPressureMmHg - waterVapourMmHg)) / 100;
  const paco2MmHg = requireCharted("paco2MmHg", input.paco2MmHg);
  if (paco2MmHg / respiratoryQuotient < inspiredMmHg) return inspiredMmHg - paco2MmHg / respiratoryQuotient;
  throw new RangeError(
    `paco2MmHg ${paco2MmHg} leaves no alveolar oxygen: allowed below ${inspiredMmHg * respiratoryQuotient} at this FiO2`,
  );
}
