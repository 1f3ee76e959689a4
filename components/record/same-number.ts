/** Equal as the core sees it (rules S1): a difference under 1e-6 is none. */
export function sameNumber(one: number, other: number): boolean {
  return Math.abs(one - other) < 1e-6;
}
