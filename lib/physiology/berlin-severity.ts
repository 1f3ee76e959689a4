import { derivedRanges } from "./derived-ranges";
import { ratioBand, type SeverityBand } from "./ratio-band";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";
import { isAbove } from "./same-number";

export const berlinEdges = { severe: 100, moderate: 200, mild: 300 } as const;

/** The definition asks for at least this PEEP or CPAP (cmH2O). */
const leastPeepCmH2O = 5;

/**
 * Berlin band of a P/F ratio: mild to 300, moderate to 200, severe to 100, each edge in the graver band, none above
 * 300; below PEEP 5 not classifiable. The band alone is not a diagnosis: onset and imaging are assessed by a person.
 * @param input.pfRatio 10 to 3334, where needed adjusted for altitude
 * @param input.peepCmH2O 0 to 50
 * @throws RangeError outside these
 * @source ARDS Definition Task Force, JAMA 2012;307:2526
 * @example berlinSeverity({ pfRatio: 200, peepCmH2O: 8 }) //=> "moderate"
 */
export function berlinSeverity(input: { pfRatio: number; peepCmH2O: number }): SeverityBand | "not classifiable" {
  const pfRatio = requireInRange("pfRatio", input.pfRatio, derivedRanges.pfRatio);
  if (isAbove(leastPeepCmH2O, requireCharted("peepCmH2O", input.peepCmH2O))) return "not classifiable";
  return ratioBand(pfRatio, berlinEdges);
}
