import type { PressureSpanProps } from "./span-reading";

/** The ruler's whole length, cmH2O. What lies beyond is drawn at its end; the label still tells the true number. */
export const spanTopCmH2O = 45;

/** Room above 45 and below 0, px, for half a numeral. */
const pad = 14;

export interface SpanMetrics {
  width: number;
  height: number;
  pxPerCmH2O: number;
  column: { left: number; right: number; middle: number };
  labelX: number;
  numberSize: number;
  /** Pixels from the top of the drawing. */
  y: (cmH2O: number) => number;
}

const sizes = {
  large: { width: 212, pxPerCmH2O: 9.25, left: 42, columnWidth: 84, numberSize: 44 },
  medium: { width: 196, pxPerCmH2O: 8.9, left: 36, columnWidth: 76, numberSize: 40 },
  phone: { width: 182, pxPerCmH2O: 6, left: 34, columnWidth: 66, numberSize: 32 },
};

export function spanMetrics(size: NonNullable<PressureSpanProps["size"]>): SpanMetrics {
  const { width, pxPerCmH2O, left, columnWidth, numberSize } = sizes[size];
  const clamp = (cmH2O: number) => Math.min(Math.max(cmH2O, 0), spanTopCmH2O);
  return {
    width,
    height: spanTopCmH2O * pxPerCmH2O + 2 * pad,
    pxPerCmH2O,
    column: { left, right: left + columnWidth, middle: left + columnWidth / 2 },
    labelX: left + columnWidth + 13,
    numberSize,
    y: (cmH2O) => pad + (spanTopCmH2O - clamp(cmH2O)) * pxPerCmH2O,
  };
}
