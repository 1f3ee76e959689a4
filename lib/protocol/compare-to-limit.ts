/** Two numbers closer than this count as one: binary floats make 27.1 − 12.1 a little more than 15. */
const sameWithin = 1e-6;

/**
 * S1: the one comparison with a limit: −1 below, 0 on it, 1 above. Never give it a rounded value.
 * @example compareToLimit(27.1 - 12.1, 15) //=> 0
 */
export function compareToLimit(a: number, b: number): -1 | 0 | 1 {
  const difference = a - b;
  if (Math.abs(difference) < sameWithin) return 0;
  return difference < 0 ? -1 : 1;
}
