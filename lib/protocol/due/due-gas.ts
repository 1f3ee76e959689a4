import { firstChangeAfter, tooSoonAfter, type Ageing } from "../freshness";
import { minuteMs } from "../instant";
import type { Scene } from "../scene";
import type { ExpiryRow } from "../timeline/expiry-rows";
import { earliest } from "./earliest";

/** F2: gases may be ordered 'as needed'. */
export function gasesAsNeeded(scene: Scene): boolean {
  return scene.targets.gasIntervalH === "as-needed";
}

export function gasAgeing(scene: Scene, row: ExpiryRow): Ageing {
  const { gasMin, gasTooSoonMin } = scene.policy.intervals;
  const ordered = scene.targets.gasIntervalH;
  const intervalMin = typeof ordered === "number" ? ordered * 60 : gasMin;
  return { row, intervalMin, tooSoonMin: gasTooSoonMin, timeless: gasesAsNeeded(scene) };
}

/** F2: the first gas is due an hour after intubation. */
export function firstGasDueAt(scene: Scene): number | null {
  if (scene.intubatedAt === null || scene.comfort || gasesAsNeeded(scene)) return null;
  return scene.clock.after(scene.intubatedAt, scene.policy.intervals.firstGasMin * minuteMs);
}

/**
 * F3: after a gas at `t` the next is due by its interval; 1 h after a prone or supine turn or ECMO on; 30 min after a
 * set rate or volume cut by a fifth, after the change that a gas was drawn too soon after, and after the change that
 * expired one last outside. Each is counted from the first such change since.
 */
export function gasDueAt(scene: Scene, ageing: Ageing, t: number, lastOutside: boolean): number | null {
  if (scene.comfort || ageing.timeless) return null;
  const { gasAfterTurnMin, gasAfterVolumeCutMin } = scene.policy.intervals;
  const since = (change: { t: number } | null, delayMin: number) =>
    change && scene.clock.after(change.t, delayMin * minuteMs);
  return earliest(
    scene.clock.after(t, ageing.intervalMin * minuteMs),
    since(firstChangeAfter(scene, "gasAfterTurn", t), gasAfterTurnMin),
    since(firstChangeAfter(scene, "gasAfterCut", t), gasAfterVolumeCutMin),
    since(tooSoonAfter(scene, ageing, t), gasAfterVolumeCutMin),
    lastOutside ? since(firstChangeAfter(scene, ageing.row, t), gasAfterVolumeCutMin) : null,
  );
}
