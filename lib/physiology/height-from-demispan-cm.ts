import { derivedRanges } from "./derived-ranges";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";
import { requireSex, type Sex } from "./sex";

const lines = {
  male: { under55: { constant: 68, slope: 1.3 }, from55: { constant: 71, slope: 1.2 } },
  female: { under55: { constant: 62, slope: 1.3 }, from55: { constant: 67, slope: 1.2 } },
};

/**
 * Estimated height (cm) from the demispan: sternal notch to the web between middle and ring finger.
 * @param input.demispanCm 50 to 120
 * @param input.ageYears 16 to 120; the line changes at 55
 * @throws RangeError outside these, or without a sex
 * @source BAPEN MUST, demispan equations by age band (from memory)
 * @example heightFromDemispanCm({ sex: "male", ageYears: 60, demispanCm: 84 }) //=> 171.8
 */
export function heightFromDemispanCm(input: { sex: Sex; ageYears: number; demispanCm: number }): number {
  const bands = lines[requireSex(input.sex)];
  const ageYears = requireInRange("ageYears", input.ageYears, derivedRanges.ageYears);
  const { constant, slope } = ageYears < 55 ? bands.under55 : bands.from55;
  return constant + slope * requireCharted("demispanCm", input.demispanCm);
}
