import type { MechanicsFact } from "../facts";
import { minuteMs } from "../instant";
import type { NoteCode } from "../note-codes";
import { hasCondition, settingsAt, type Scene } from "../scene";
import { numberInForce } from "../timeline/fold-settings";
import { countUntil, newestUntil, type Item } from "../timeline/item";
import type { Input } from "./reading";

/** V4: the total PEEP that belongs to a reading; null when it must be measured first. */
export interface TotalPeep {
  value: number | null;
  notes: NoteCode[];
  inputs: Input[];
}

/** Trapped gas > 0 by the newest expiratory hold that still held at the reading, or that came after it. */
function gasIsTrapped(scene: Scene, t: number): boolean {
  const { totalPeeps, changes } = scene.line;
  const hold = newestUntil(totalPeeps, scene.at);
  const near = hold && hold.t > t ? hold : newestUntil(totalPeeps, t);
  if (!near) return false;
  const [from, to] = near.t < t ? [near.t, t] : [t, near.t];
  const expired = countUntil(changes.pressures, to) > countUntil(changes.pressures, from);
  const lapsed = scene.clock.between(from, to) >= 2 * scene.policy.intervals.pressuresMin * minuteMs;
  const setCmH2O = numberInForce(settingsAt(scene, near.t), "peepCmH2O");
  return !expired && !lapsed && setCmH2O !== null && (near.fact.totalPeepCmH2O ?? 0) > setCmH2O;
}

/**
 * V4: total PEEP of the same reading; with no expiratory hold in it the set PEEP then in force, except under the
 * condition *obstructive* or with trapped gas: there total PEEP has to be measured.
 */
export function totalPeepOf(scene: Scene, item: Item<MechanicsFact>): TotalPeep {
  const measured = item.fact.totalPeepCmH2O ?? null;
  if (measured !== null) {
    return { value: measured, notes: [], inputs: [{ name: "totalPeepCmH2O", value: measured, unit: "cmH2O", item }] };
  }
  if (hasCondition(scene.targets, "obstructive") || gasIsTrapped(scene, item.t)) {
    return { value: null, notes: ["needs-total-peep"], inputs: [] };
  }
  const held = settingsAt(scene, item.t)?.values.peepCmH2O;
  if (!held) return { value: null, notes: ["not-computable"], inputs: [] };
  const set = Number(held.value);
  const inputs = [{ name: "peepCmH2O", value: set, unit: "cmH2O", item: held.item }];
  return { value: set, notes: ["assumes-no-trapped-gas"], inputs };
}
