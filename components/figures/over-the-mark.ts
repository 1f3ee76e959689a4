import type { SpanLimits } from "./span-reading";

/** Below this two pressures are the same one (27.1 − 12.1 is 15). */
const samePressure = 1e-6;

export interface Mark {
  /** cmH2O where the bar meets its limit first: the plateau limit, or PEEP plus the driving limit. Null without limits. */
  at: number | null;
  cap: "none" | "lip" | "block";
}

/** Whether a bar from `basePeep` to `plateau` (cmH2O) stands under, on or over the nearer of its two limits. */
export function overTheMark(bar: { basePeep: number; plateau: number; limits: SpanLimits; edge?: boolean }): Mark {
  const { basePeep, plateau, limits, edge = false } = bar;
  const at = Math.min(limits.plateau ?? Infinity, limits.driving === null ? Infinity : basePeep + limits.driving);
  if (at === Infinity) return { at: null, cap: "none" };
  const beyond = plateau - at;
  if (beyond > samePressure) return { at, cap: "block" };
  return { at, cap: edge || beyond >= -samePressure ? "lip" : "none" };
}
