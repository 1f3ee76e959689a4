import { isoOf } from "./instant";
import type { Scene } from "./scene";
import { countUntil } from "./timeline/item";

/** The next moment at which time alone changes a state or word: a fact charted ahead counts when its time comes. */
export function validUntilOf(scene: Scene): string | null {
  const { moments } = scene.line;
  const next = moments[countUntil(moments, scene.at)]?.t;
  const ahead = [...scene.moments, ...scene.clock.edges, ...(next === undefined ? [] : [next])];
  const later = ahead.filter((moment) => moment > scene.at);
  return later.length === 0 ? null : isoOf(Math.min(...later));
}
