import { firstChangeAfter } from "../freshness";
import { minuteMs } from "../instant";
import type { Scene } from "../scene";
import type { Hold } from "../timeline/holds";
import { countUntil } from "../timeline/item";
import { dueAfterChange, dueOnReturn } from "./due-after-change";

/** The newest hold a person did; P-high of APRV is none. */
export function newestHold(scene: Scene): Hold | null {
  const { holds } = scene.line;
  for (let index = countUntil(holds, scene.at) - 1; index >= 0; index--) {
    if (holds[index]!.quality !== "p-high") return holds[index]!;
  }
  return null;
}

/** V8: `relaxed` and `not-possible` set the clock to 4 h, the others to 30 min. */
function nextByClock(scene: Scene, hold: Hold): number | null {
  const { pressuresMin, holdAfterEffortMin } = scene.policy.intervals;
  const settled = hold.quality === "relaxed" || hold.quality === "not-possible";
  return scene.clock.after(hold.t, (settled ? pressuresMin : holdAfterEffortMin) * minuteMs);
}

function nextHold(scene: Scene, hold: Hold | null): number | null {
  const { holdAfterChangeMin } = scene.policy.intervals;
  const asksFrom = scene.settings?.askBegan ?? scene.settings?.modeBegan ?? scene.at;
  if (hold === null) return scene.clock.after(asksFrom, holdAfterChangeMin * minuteMs);
  const changed = firstChangeAfter(scene, "pressures", hold.t)?.t ?? null;
  if (hold.t >= asksFrom) return dueAfterChange(scene, nextByClock(scene, hold), changed, holdAfterChangeMin);
  return scene.clock.after(Math.max(changed ?? asksFrom, asksFrom), holdAfterChangeMin * minuteMs);
}

/**
 * F3: the first hold is due 30 min after the first settings of a mode that asks a plateau and after the first listed
 * change since the last hold, then every 4 h from the last. Null where the mode does not ask.
 */
export function holdDueAt(scene: Scene): number | null {
  if (!scene.asksPlateau || scene.comfort) return null;
  const hold = newestHold(scene);
  return dueOnReturn(scene, hold?.t ?? null, nextHold(scene, hold));
}
