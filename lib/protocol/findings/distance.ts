import type { Judged } from "../judge/judged";
import { distanceTo, sideOf, type Side } from "../state-of";
import { stepOf } from "./steps";

/** The number a finding stands on: the value, one of two answers on the same side (V12), or the last known. */
function standsOn({ reading, last, alternatives }: Judged): number | null {
  const byWeight = alternatives.find(({ note }) => note === "male");
  return reading?.value ?? byWeight?.value ?? last?.value ?? null;
}

/** Where a finding is or was outside: the value's side while it is outside, else that of the last known (F7). */
export function sideOut(judged: Judged): Side | null {
  const value = judged.state === "outside" ? standsOn(judged) : (judged.last?.value ?? null);
  return value === null || !judged.limit ? null : sideOf(value, judged.limit);
}

/** A1: distance of the value from its nearest limit, in its unit; null without a value. */
export function distanceOf({ reading, limit }: Judged): number | null {
  const value = reading?.value ?? null;
  return value === null || !limit ? null : distanceTo(value, limit);
}

/** S4: how far out, in steps of A2, by the value or the last known. */
export function stepsOut(judged: Judged): number {
  const value = judged.state === "outside" ? standsOn(judged) : (judged.last?.value ?? null);
  if (value === null || !judged.limit || sideOf(value, judged.limit) === null) return 0;
  return (distanceTo(value, judged.limit) ?? 0) / stepOf(judged.name, judged.unit);
}
