import { chartedRanges, type ChartedField } from "./limits";
import { requireInRange } from "./require-in-range";

/** A value inside the refuse range of its charted field. @throws RangeError @param name the argument's own name */
export function requireCharted(field: ChartedField, value: number, name: string = field): number {
  return requireInRange(name, value, chartedRanges[field].refuse, field);
}
