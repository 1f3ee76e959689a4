/** Refuses what is no finite number, so that NaN never reaches a screen. */
export function requireFinite(field: string, value: number): number {
  if (typeof value === "number" && Number.isFinite(value)) return value;
  throw new RangeError(`${field} must be a finite number, got ${JSON.stringify(value) ?? String(value)}`);
}
