import { exhaledVolumePerKg } from "../../physiology/exhaled-volume-per-kg";
import { compareToLimit } from "../compare-to-limit";
import { computable } from "../judge/computable";
import { orderedRange, withinOrder } from "../judge/within-order";
import type { State } from "../result";
import type { Scene } from "../scene";
import { sideOf } from "../state-of";
import type { Range } from "../targets";

/** V6, V12: what a volume in millilitres says against the order. */
export interface VolumeVerdict {
  /** Null where it cannot be said: no PBW and no order in millilitres, or two answers that differ. */
  state: State | null;
  /** In the metric's unit; null without a single PBW. */
  value: number | null;
  alternatives: { male: number | null; female: number | null } | null;
}

const perKg = (volumeMl: number, pbwKg: number) =>
  computable(() => exhaledVolumePerKg({ exhaledTidalVolumeMl: volumeMl, pbwKg }));

/** S2: a set volume within half a machine step of a limit in mL/kg counts as on it. */
function isOnLimit(scene: Scene, volumeMl: number, pbwKg: number, { min, max }: Range): boolean {
  const half = scene.policy.steps.tidalVolumeMl / 2;
  return [min, max].some(
    (bound) => bound !== undefined && bound !== null && compareToLimit(Math.abs(volumeMl - bound * pbwKg), half) <= 0,
  );
}

function stateByWeight(scene: Scene, volumeMl: number, isSet: boolean, pbwKg: number, limit: Range): State | null {
  if (isSet && isOnLimit(scene, volumeMl, pbwKg, limit)) return "edge";
  const value = perKg(volumeMl, pbwKg);
  return value === null ? null : withinOrder("vtMlPerKg", value, limit);
}

/** V12: both outside on one side is outside, both within is within; anything else is no answer. */
function sharedState(scene: Scene, volumeMl: number, isSet: boolean, limit: Range): State | null {
  const { male, female } = scene.pbw.alternatives!;
  const states = [male, female].map((pbwKg) => stateByWeight(scene, volumeMl, isSet, pbwKg, limit));
  const sides = [male, female].map((pbwKg) => sideOf(volumeMl / pbwKg, limit));
  if (states.every((state) => state === "outside")) return sides[0] === sides[1] ? "outside" : null;
  if (states.some((state) => state === "outside" || state === null)) return null;
  return states.includes("edge") ? "edge" : "inside";
}

/** V12: is the volume judged in millilitres: by an order in mL, where there is no PBW? */
export function isJudgedInMl(scene: Scene): boolean {
  return scene.pbw.pbwKg === null && orderedRange(scene.targets.vtMl) !== null;
}

/** The ordered range in the unit shown: an order in mL is divided by PBW where there is one. */
export function volumeLimit(scene: Scene): Range | null {
  const inMl = orderedRange(scene.targets.vtMl);
  if (!inMl) return orderedRange(scene.targets.vtMlPerKg);
  const { pbwKg } = scene.pbw;
  if (pbwKg === null) return inMl;
  const scaled = (bound: number | null | undefined) =>
    bound === null || bound === undefined ? undefined : bound / pbwKg;
  return { min: scaled(inMl.min), max: scaled(inMl.max) };
}

/** V6, V12, S2: a volume against the order: in mL/kg, or in mL by an order in mL. */
export function judgeVolumeMl(scene: Scene, volumeMl: number, isSet: boolean): VolumeVerdict {
  const { pbwKg, alternatives } = scene.pbw;
  const inMl = orderedRange(scene.targets.vtMl);
  const limit = orderedRange(scene.targets.vtMlPerKg);
  const value = pbwKg === null ? null : perKg(volumeMl, pbwKg);
  if (inMl) return { state: withinOrder("vtMlPerKg", volumeMl, inMl), value: value ?? volumeMl, alternatives: null };
  if (pbwKg !== null) {
    return { state: limit && stateByWeight(scene, volumeMl, isSet, pbwKg, limit), value, alternatives: null };
  }
  if (!alternatives) return { state: null, value: null, alternatives: null };
  return {
    state: limit && sharedState(scene, volumeMl, isSet, limit),
    value: null,
    alternatives: { male: perKg(volumeMl, alternatives.male), female: perKg(volumeMl, alternatives.female) },
  };
}
