import { requireFinite } from "./require-finite";

/** Doubles carry about 15 digits; 12 drop the noise of a few operations and keep every digit that was charted. */
const significantDigits = 12;

function shiftDecimalPoint(value: number, places: number): number {
  const [digits, exponent = "0"] = value.toString().split("e");
  return Number(`${digits}e${Number(exponent) + places}`);
}

/**
 * Rounds once for display, halves away from zero (never half-even), blind to float noise.
 * @param decimals digits after the decimal point, 0 to 10
 * @example roundHalfUp(1.005, 2) //=> 1.01
 * @example roundHalfUp(45.5 * 5, 0) //=> 228
 */
export function roundHalfUp(value: number, decimals: number): number {
  const magnitude = Number(Math.abs(requireFinite("value", value)).toPrecision(significantDigits));
  const rounded = shiftDecimalPoint(Math.round(shiftDecimalPoint(magnitude, decimals)), -decimals);
  return value < 0 && rounded !== 0 ? -rounded : rounded;
}
