import type { Excursion, OutsideRun } from "../judge/judged";
import type { State } from "../result";
import type { Scene } from "../scene";
import { countUntil, recordedAt } from "../timeline/item";
import type { VolumePoint } from "../timeline/volume-points";
import { judgeVolumeMl, volumeLimit } from "./judge-volume";

/** V6, F7: what the record of set and measured volumes says at the moment. */
export interface VolumeRun {
  /** The newest point that could be judged, or the newest where nothing is ordered; and its state. */
  last: VolumePoint | null;
  lastState: State | null;
  /** A measured volume was last outside, and no measured one inside since. */
  held: VolumePoint | null;
  /** Since when set or measured has been outside without a break. */
  run: OutsideRun | null;
}

interface Walk extends VolumeRun {
  setOutside: boolean;
}

function step(walk: Walk, point: VolumePoint, state: State): void {
  const outside = state === "outside";
  walk.last = point;
  walk.lastState = state;
  if (point.measured) walk.held = outside && !point.isSet ? point : null;
  if (point.isSet || !outside) walk.setOutside = outside;
  if (!walk.held && !walk.setOutside) {
    walk.run = null;
    return;
  }
  const recorded = recordedAt(point.item);
  walk.run = walk.run
    ? { since: walk.run.since, recordedFrom: Math.min(walk.run.recordedFrom, outside ? recorded : Infinity) }
    : { since: point.t, recordedFrom: recorded };
}

/** Walks the points once, oldest first, by the order now in force. */
export function volumeRun(scene: Scene): VolumeRun {
  const { volumePoints } = scene.line;
  const walk: Walk = { last: null, lastState: null, held: null, run: null, setOutside: false };
  const count = countUntil(volumePoints, scene.at);
  const ordered = volumeLimit(scene) !== null;
  for (let index = 0; index < count; index++) {
    const point = volumePoints[index]!;
    const { state } = judgeVolumeMl(scene, point.volumeMl, point.isSet);
    if (state !== null) step(walk, point, state);
    else if (!ordered) walk.last = point;
  }
  return walk;
}

/** A2: volumes judged outside after a moment, oldest first. */
export function volumeExcursionsAfter(scene: Scene, t: number): Excursion[] {
  const { volumePoints } = scene.line;
  const walk: Walk = { last: null, lastState: null, held: null, run: null, setOutside: false };
  const excursions: Excursion[] = [];
  for (const point of volumePoints.slice(0, countUntil(volumePoints, scene.at))) {
    const { state, value } = judgeVolumeMl(scene, point.volumeMl, point.isSet);
    if (state === null) continue;
    const starts = walk.run === null;
    step(walk, point, state);
    const recorded = recordedAt(point.item);
    if (state === "outside" && value !== null && point.t > t)
      excursions.push({ t: point.t, recordedAt: recorded, value, starts });
  }
  return excursions;
}
