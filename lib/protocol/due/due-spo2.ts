import { firstChangeAfter, tooSoonAfter, type Ageing } from "../freshness";
import { minuteMs } from "../instant";
import type { Scene } from "../scene";
import { newestUntil } from "../timeline/item";
import { dueAfterChange, dueOnReturn } from "./due-after-change";
import { earliest } from "./earliest";

export function spo2Ageing(scene: Scene): Ageing {
  const { spo2Min, spo2AfterChangeMin } = scene.policy.intervals;
  return { row: "oxygen", intervalMin: spo2Min, tooSoonMin: spo2AfterChangeMin };
}

function nextSpo2(scene: Scene, t: number): number | null {
  const { spo2Min, spo2AfterChangeMin } = scene.policy.intervals;
  const regular = scene.clock.after(t, spo2Min * minuteMs);
  const changed = firstChangeAfter(scene, "oxygen", t)?.t ?? null;
  const soon = tooSoonAfter(scene, spo2Ageing(scene), t);
  const again = soon && scene.clock.after(soon.t, spo2AfterChangeMin * minuteMs);
  return earliest(again, dueAfterChange(scene, regular, changed, spo2AfterChangeMin));
}

/** F2, F3: SpO2 is due hourly, and 10 min after a change that expires it or that it was read too soon after. */
export function spo2DueAt(scene: Scene): number | null {
  if (scene.comfort) return null;
  const newest = newestUntil(scene.line.spo2, scene.at);
  if (newest) return dueOnReturn(scene, newest.t, nextSpo2(scene, newest.t));
  const first = scene.intubatedAt;
  const due = first === null ? null : scene.clock.after(first, scene.policy.intervals.spo2Min * minuteMs);
  return dueOnReturn(scene, null, due);
}
