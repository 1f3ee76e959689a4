import type { Mark } from "./over-the-mark";

/** Two stretches along the pressure axis, in px from zero pressure, ascending. */
export interface BarStack {
  bar: [from: number, to: number];
  /** The lip or the block above the gap. */
  cap: [from: number, to: number] | null;
}

export interface StackMeasures {
  /** Between bar and cap, px: with the overhang it tells the cap without colour. */
  gap: number;
  lip: number;
  /** A block is never drawn shorter than this: 0.1 cmH2O over the mark must still stand out above it. */
  leastBlock: number;
}

/** Where bar and cap stand along the axis; `base`, `top`, `mark` in px from zero pressure. */
export function barStack(
  span: { base: number; top: number; mark: number | null; cap: Mark["cap"] },
  { gap, lip, leastBlock }: StackMeasures,
): BarStack {
  const { base, top, mark, cap } = span;
  if (cap === "none" || mark === null) return { bar: [base, top], cap: null };
  const capFrom = cap === "lip" ? top - lip : Math.max(mark, base) + gap / 2;
  const capTo = cap === "lip" ? top : Math.max(top, capFrom + leastBlock);
  return { bar: [base, Math.max(base, capFrom - gap)], cap: [capFrom, capTo] };
}
