import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";
import { requireSex, type Sex } from "./sex";

/** The ages the equation was made for. */
const studiedAgeYears = { min: 60, max: 90 };

/**
 * Estimated height (cm) from knee height.
 * @param input.kneeHeightCm 30 to 75
 * @param input.ageYears 60 to 90
 * @throws RangeError outside these, or without a sex
 * @source Chumlea, J Am Geriatr Soc 1985;33:116
 * @example heightFromKneeHeightCm({ sex: "male", ageYears: 70, kneeHeightCm: 50 }) //=> 162.39
 */
export function heightFromKneeHeightCm(input: { sex: Sex; ageYears: number; kneeHeightCm: number }): number {
  const sex = requireSex(input.sex);
  const ageYears = requireInRange("ageYears", input.ageYears, studiedAgeYears);
  const kneeHeightCm = requireCharted("kneeHeightCm", input.kneeHeightCm);
  if (sex === "male") return 64.19 - 0.04 * ageYears + 2.02 * kneeHeightCm;
  return 84.88 - 0.24 * ageYears + 1.83 * kneeHeightCm;
}
