import { requireFinite } from "./require-finite";

/** Float noise on an exact whole millilitre must not move it inward by a whole one. */
const noise = 1e-6;

/**
 * An ordered volume range in whole millilitres, each limit rounded inward so that what is read off is inside the order.
 * A range narrower than one millilitre holds no whole one: then `minMl` exceeds `maxMl`.
 * @example inwardMillilitres({ minMlPerKg: 5, maxMlPerKg: 7, pbwKg: 70.566 }) //=> { minMl: 353, maxMl: 493 }
 */
export function inwardMillilitres(order: { minMlPerKg?: number; maxMlPerKg: number; pbwKg: number }): {
  minMl?: number;
  maxMl: number;
} {
  const pbwKg = requireFinite("pbwKg", order.pbwKg);
  const maxMl = Math.floor(requireFinite("maxMlPerKg", order.maxMlPerKg) * pbwKg + noise);
  if (order.minMlPerKg === undefined) return { maxMl };
  return { minMl: Math.ceil(requireFinite("minMlPerKg", order.minMlPerKg) * pbwKg - noise), maxMl };
}
