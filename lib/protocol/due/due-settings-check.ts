import { minuteMs } from "../instant";
import type { Scene } from "../scene";
import { newestUntil } from "../timeline/item";
import { dueOnReturn } from "./due-after-change";

/** F2, F3: settings neither charted nor checked for 4 h, and on return from a pause. */
export function settingsCheckDueAt(scene: Scene): number | null {
  if (!scene.settings) return null;
  const checked = newestUntil(scene.line.settingsChecks, scene.at)?.t ?? -Infinity;
  const last = Math.max(scene.settings.t, checked);
  return dueOnReturn(scene, last, scene.clock.after(last, scene.policy.intervals.settingsCheckMin * minuteMs));
}
