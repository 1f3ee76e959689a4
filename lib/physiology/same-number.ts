/** Two numbers count as one below this difference: binary floats make 27.1 − 12.1 a little more than 15. */
const sameNumberWithin = 1e-6;

/** Is `a` above `b` by more than float noise? */
export function isAbove(a: number, b: number): boolean {
  return a - b >= sameNumberWithin;
}
