import { edgeMargin } from "../edge-margin";
import type { DerivedName, State } from "../result";
import { stateOf } from "../state-of";
import type { Range } from "../targets";

/** A range that bounds something; null where nothing is ordered. */
export function orderedRange(range: Range | null | undefined): Range | null {
  if (!range) return null;
  const bounded = (bound: number | null | undefined) => bound !== null && bound !== undefined;
  return bounded(range.min) || bounded(range.max) ? range : null;
}

/** S1, S2: a value's state within an ordered range, with the metric's edge. `judged` leaves out a side (S5). */
export function withinOrder(metric: DerivedName, value: number, ordered: Range, judged: Range = ordered): State {
  return stateOf({ value, limit: judged, margin: edgeMargin(metric, ordered) });
}
