import { spanTopCmH2O } from "./span-metrics";

export interface MiniScale {
  width: number;
  /** Pixels from the left edge; beyond the ruler's ends a value is drawn at the end. */
  x: (cmH2O: number) => number;
}

export function miniScale(width: number): MiniScale {
  return { width, x: (cmH2O) => (Math.min(Math.max(cmH2O, 0), spanTopCmH2O) / spanTopCmH2O) * width };
}

/** Rows of the drawing, px from its top. */
export const miniRows = { barTop: 6, barHeight: 18, barFoot: 24, middle: 15, labelBaseline: 40 };
