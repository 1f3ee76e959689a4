import { slippedUnit } from "./slipped-unit";

export interface AllowedRange {
  min: number;
  max: number;
}

/**
 * The door of every function here: a finite number inside its range (bounds included), or RangeError naming field,
 * value, allowed range and, where the value looks like one, the slipped unit.
 * @param kind the field whose unit slips apply, where the argument bears another name
 */
export function requireInRange(field: string, value: number, allowed: AllowedRange, kind: string = field): number {
  if (typeof value !== "number" || !Number.isFinite(value)) {
    const got = typeof value === "number" ? String(value) : (JSON.stringify(value) ?? "nothing");
    throw new RangeError(`${field} must be a number, got ${got}: allowed ${allowed.min} to ${allowed.max}`);
  }
  if (value >= allowed.min && value <= allowed.max) return value;
  const unit = slippedUnit(kind, value);
  const hint = unit === null ? "" : `; it looks like ${unit}`;
  throw new RangeError(`${field} ${value} is outside the allowed ${allowed.min} to ${allowed.max}${hint}`);
}
