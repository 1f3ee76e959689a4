import { minuteMs } from "../instant";
import type { Scene } from "../scene";
import type { ExpiryRow } from "../timeline/expiry-rows";
import { countUntil } from "../timeline/item";
import { pairedWithinMin } from "../unit-policy-defaults";

function belongs(scene: Scene, row: ExpiryRow, a: number, b: number): boolean {
  const changes = scene.line.changes[row];
  const [from, to] = a < b ? [a, b] : [b, a];
  if (to - from > pairedWithinMin * minuteMs) return false;
  return countUntil(changes, from) === countUntil(changes, to);
}

/** V5: the newest of some readings before a moment, else the first after it, within 1 h and no listed change between. */
export function pairedWith<T extends { t: number }>(
  scene: Scene,
  items: readonly T[],
  row: ExpiryRow,
  t: number,
): T | null {
  const count = countUntil(items, t);
  const before = items[count - 1];
  if (before && belongs(scene, row, before.t, t)) return before;
  const after = items[count];
  return after && after.t <= scene.at && belongs(scene, row, t, after.t) ? after : null;
}
