import { roundHalfUp } from "./round-half-up";

/** Below this a value counts as equal to a limit, on screen as in judgement. */
const sameAsLimit = 1e-6;
const mostDecimals = 7;

function sideOf(value: number, limit: number): number {
  return Math.abs(value - limit) < sameAsLimit ? 0 : Math.sign(value - limit);
}

/**
 * A number as people read it: half-up, fixed decimals; more decimals where rounding would hide on which side of a
 * limit the value stands.
 * @param limit one ordered limit, or both
 * @example displayNumber({ value: 30.04, decimals: 0, limit: 30 }) //=> "30.04"
 * @example displayNumber({ value: 5.952, decimals: 1 }) //=> "6.0"
 */
export function displayNumber(input: { value: number; decimals: number; limit?: number | readonly number[] }): string {
  const { value, limit = [] } = input;
  const limits = typeof limit === "number" ? [limit] : limit;
  let decimals = input.decimals;
  const hidesASide = () => limits.some((each) => sideOf(value, each) !== sideOf(roundHalfUp(value, decimals), each));
  while (decimals < mostDecimals && hidesASide()) decimals += 1;
  return roundHalfUp(value, decimals).toFixed(decimals);
}
