import { derivedRanges } from "./derived-ranges";
import { requireAbove } from "./require-above";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";

/**
 * Time left to breathe out (s): the breath's length minus inspiration.
 * @param input.respiratoryRate 1 to 150
 * @param input.inspiratoryTimeS 0.1 to 10, and shorter than the breath
 * @throws RangeError outside these
 * @source definition
 * @example expiratoryTimeS({ respiratoryRate: 24, inspiratoryTimeS: 0.72 }) //=> 1.78
 */
export function expiratoryTimeS(input: { respiratoryRate: number; inspiratoryTimeS: number }): number {
  const breathS = 60 / requireInRange("respiratoryRate", input.respiratoryRate, derivedRanges.respiratoryRate);
  const inspiratoryTimeS = requireCharted("inspiratoryTimeS", input.inspiratoryTimeS);
  requireAbove({ name: "breath length", value: breathS }, { name: "inspiratoryTimeS", value: inspiratoryTimeS });
  return breathS - inspiratoryTimeS;
}
