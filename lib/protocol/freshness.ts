import { minuteMs } from "./instant";
import type { FreshnessWord } from "./result";
import type { Scene } from "./scene";
import type { Change } from "./timeline/change-kinds";
import type { ExpiryRow } from "./timeline/expiry-rows";
import { countUntil } from "./timeline/item";

/** How a result ages. */
export interface Ageing {
  /** Null for a set value: nothing expires it. */
  row: ExpiryRow | null;
  intervalMin: number;
  /** F5: withheld when read sooner than this after a listed change. */
  tooSoonMin?: number;
  /** Never lapses: gases ordered 'as needed' (F2), set values. */
  timeless?: boolean;
}

export interface Freshness {
  word: FreshnessWord;
  change: Change | null;
}

/** F6: the first listed change after a moment; one at the same moment came before (V3). */
export function firstChangeAfter(scene: Scene, row: ExpiryRow | null, t: number): Change | null {
  if (row === null) return null;
  const changes = scene.line.changes[row];
  const change = changes[countUntil(changes, t)];
  return change && change.t <= scene.at ? change : null;
}

/** F5: the listed change that a reading at `t` came too soon after; null when none. */
export function tooSoonAfter(scene: Scene, ageing: Ageing, t: number): Change | null {
  if (!ageing.tooSoonMin || ageing.row === null) return null;
  const changes = scene.line.changes[ageing.row];
  const change = changes[countUntil(changes, t) - 1];
  return change && t - change.t < ageing.tooSoonMin * minuteMs ? change : null;
}

/** Note a moment ahead at which time alone changes a word. */
export function foresee(scene: Scene, moment: number | null): void {
  if (moment !== null && moment > scene.at) scene.moments.push(moment);
}

/** F1: the first that applies to a reading at `t`: changed since, lapsed, too soon, due, current. */
export function freshnessOf(scene: Scene, ageing: Ageing, t: number, dueAt: number | null): Freshness {
  const change = firstChangeAfter(scene, ageing.row, t);
  if (change) return { word: "changed-since", change };
  if (!ageing.timeless) {
    const lapsesAfter = 2 * ageing.intervalMin * minuteMs;
    if (scene.clock.between(t, scene.at) >= lapsesAfter) return { word: "lapsed", change: null };
    foresee(scene, scene.clock.after(t, lapsesAfter));
  }
  const soon = tooSoonAfter(scene, ageing, t);
  if (soon) return { word: "too-soon", change: soon };
  if (dueAt !== null && scene.at >= dueAt) return { word: "due", change: null };
  foresee(scene, dueAt);
  return { word: "current", change: null };
}

/** F1: *fresh* is current or due. */
export function isFresh(word: FreshnessWord): boolean {
  return word === "current" || word === "due";
}
