import { pbwHeightCm } from "./limits";
import { requireInRange } from "./require-in-range";
import { requireSex, type Sex } from "./sex";

/**
 * Predicted body weight (kg), the weight that tidal volume is scaled to; adults only. Below 152.4 cm the line is
 * extrapolated, and whoever shows the number says so (`pbwHeightCm.extrapolatedBelow`).
 * @param input.heightCm 120 to 250
 * @throws RangeError outside that, or without a sex
 * @source ARDS Network, N Engl J Med 2000;342:1301, form in centimetres
 * @example predictedBodyWeightKg({ sex: "male", heightCm: 175 }) //=> 70.566
 */
export function predictedBodyWeightKg(input: { sex: Sex; heightCm: number }): number {
  const base = requireSex(input.sex) === "male" ? 50 : 45.5;
  return base + 0.91 * (requireInRange("heightCm", input.heightCm, pbwHeightCm) - 152.4);
}
