import { derivedRanges } from "./derived-ranges";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";
import { requireNotBelow } from "./require-not-below";

/**
 * Physiological dead space as a fraction of tidal volume: (PaCO2 − mixed expired CO2) / PaCO2. Mixed expired is not
 * end-tidal.
 * @param input.paco2MmHg 8 to 250
 * @param input.mixedExpiredCo2MmHg 0 up to PaCO2
 * @throws RangeError outside these
 * @source Enghoff 1938 (from memory)
 * @example deadSpaceFractionEnghoff({ paco2MmHg: 40, mixedExpiredCo2MmHg: 28 }) //=> 0.3
 */
export function deadSpaceFractionEnghoff(input: { paco2MmHg: number; mixedExpiredCo2MmHg: number }): number {
  const paco2MmHg = requireCharted("paco2MmHg", input.paco2MmHg);
  const { mixedExpiredCo2MmHg } = input;
  requireInRange("mixedExpiredCo2MmHg", mixedExpiredCo2MmHg, derivedRanges.mixedExpiredCo2MmHg);
  requireNotBelow({ name: "paco2MmHg", value: paco2MmHg }, { name: "mixedExpiredCo2MmHg", value: mixedExpiredCo2MmHg });
  return Math.max(0, paco2MmHg - mixedExpiredCo2MmHg) / paco2MmHg;
}
