import { displayNumber, roundHalfUp } from "@/lib/format";

/** A pressure (cmH2O) as charted: whole where it is whole, else one decimal, more where the limit's side would hide. */
export function pressureText(value: number, limit?: number | null): string {
  const decimals = Number.isInteger(roundHalfUp(value, 1)) ? 0 : 1;
  return displayNumber({ value, decimals, limit: limit ?? [] });
}
