import { isoOf } from "./instant";
import type { Scene } from "./scene";
import { countUntil } from "./timeline/item";

/** The next moment at which time alone changes a state or word: a fact charted ahead counts when its time comes. */
export function validUntilOf(scene: Scene): string | null {
  const { moments, clock, line, at } = scene;
  let next = Infinity;
  for (const moment of moments) if (moment > at && moment < next) next = moment;
  for (const edge of clock.edges) if (edge > at && edge < next) next = edge;
  for (const facts of line.all) next = Math.min(next, facts[countUntil(facts, at)]?.t ?? Infinity);
  return next === Infinity ? null : isoOf(next);
}
