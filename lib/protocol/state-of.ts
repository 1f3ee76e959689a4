import { compareToLimit } from "./compare-to-limit";
import type { State } from "./result";
import type { Range } from "./targets";

export type Side = "below" | "above";

/** On which side of its range a value lies outside; null when it lies within or on a limit. */
export function sideOf(value: number, limit: Range): Side | null {
  if (isBound(limit.min) && compareToLimit(value, limit.min) < 0) return "below";
  if (isBound(limit.max) && compareToLimit(value, limit.max) > 0) return "above";
  return null;
}

/** How far from the nearest bound, on either side of it; null without a bound. */
export function distanceTo(value: number, limit: Range): number | null {
  const side = sideOf(value, limit);
  const away = (bound: number | null | undefined) => (isBound(bound) ? Math.abs(value - bound) : Infinity);
  if (side !== null) return away(side === "below" ? limit.min : limit.max);
  const nearest = Math.min(away(limit.min), away(limit.max));
  return Number.isFinite(nearest) ? nearest : null;
}

/**
 * S1, S2: beyond a limit is outside; exactly on it, or within `margin` on its inner side (S6: distance ≤ margin), is
 * edge. Without a margin limits are inclusive and nothing has an edge. No value is unmeasured, no bound not asked.
 * @example stateOf({ value: 29.5, limit: { max: 30 }, margin: 0.5 }) //=> "edge"
 */
export function stateOf(input: {
  value: number | null | undefined;
  limit: Range | null | undefined;
  margin?: number | null;
}): State {
  const { value, limit, margin } = input;
  if (!limit || (!isBound(limit.min) && !isBound(limit.max))) return "not-asked";
  if (value === null || value === undefined) return "unmeasured";
  if (sideOf(value, limit) !== null) return "outside";
  if (margin === null || margin === undefined) return "inside";
  const distance = distanceTo(value, limit);
  return distance !== null && compareToLimit(distance, margin) <= 0 ? "edge" : "inside";
}

function isBound(bound: number | null | undefined): bound is number {
  return bound !== null && bound !== undefined;
}
