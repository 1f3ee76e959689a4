import { requireCharted } from "./require-charted";

/** Solubility of CO2 in plasma (mmol/L for each mmHg). */
const co2SolubilityMmolPerLPerMmHg = 0.0307;

/**
 * pH from PaCO2 and bicarbonate, Henderson–Hasselbalch: 6.1 + log10(HCO3 / (0.0307 × PaCO2)).
 * @param input.paco2MmHg 8 to 250
 * @param input.hco3MmolPerL 1 to 80, held constant
 * @throws RangeError outside these
 * @source Henderson–Hasselbalch; common practice for the constants
 * @example predictedPh({ paco2MmHg: 40, hco3MmolPerL: 24 }) //=> 7.391
 */
export function predictedPh(input: { paco2MmHg: number; hco3MmolPerL: number }): number {
  const dissolvedMmolPerL = co2SolubilityMmolPerLPerMmHg * requireCharted("paco2MmHg", input.paco2MmHg);
  return 6.1 + Math.log10(requireCharted("hco3MmolPerL", input.hco3MmolPerL) / dissolvedMmolPerL);
}
