import { derivedRanges } from "./derived-ranges";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";
import { requireSex, type Sex } from "./sex";

const lines = {
  male: { under65: { constant: 79.2, slope: 3.6 }, from65: { constant: 86.3, slope: 3.15 } },
  female: { under65: { constant: 95.6, slope: 2.77 }, from65: { constant: 80.4, slope: 3.25 } },
};

/**
 * Estimated height (cm) from the ulna: olecranon to the middle of the styloid process, left side if possible.
 * It overestimates in many populations, so it is always shown as estimated.
 * @param input.ulnaCm 18.5 to 32.0
 * @param input.ageYears 16 to 120; the line changes at 65
 * @throws RangeError outside these, or without a sex
 * @source Elia 2003, the regression behind the BAPEN MUST table (from memory)
 * @example heightFromUlnaCm({ sex: "male", ageYears: 58, ulnaCm: 26 }) //=> 172.8
 */
export function heightFromUlnaCm(input: { sex: Sex; ageYears: number; ulnaCm: number }): number {
  const bands = lines[requireSex(input.sex)];
  const ageYears = requireInRange("ageYears", input.ageYears, derivedRanges.ageYears);
  const { constant, slope } = ageYears < 65 ? bands.under65 : bands.from65;
  return constant + slope * requireCharted("ulnaCm", input.ulnaCm);
}
