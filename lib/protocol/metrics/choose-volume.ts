import { compareToLimit } from "../compare-to-limit";
import type { MechanicsFact } from "../facts";
import { freshnessOf, isFresh, type Freshness } from "../freshness";
import type { Reading } from "../judge/reading";
import type { VolumePlan } from "../modes-asked";
import type { NoteCode } from "../note-codes";
import type { Scene } from "../scene";
import type { Held } from "../timeline/fold-settings";
import { newestUntil, type Item } from "../timeline/item";
import { differsFromSet } from "../timeline/volume-points";
import { afterInterval } from "./after-interval";

/** V6: exhaled under this share of set is asked about: a leak? */
const leakBelow = 0.85;

type MeasuredField = "exhaledTidalVolumeMl" | "spontaneousTidalVolumeMl";

/** A measured volume with its age. */
interface Measured {
  item: Item<MechanicsFact>;
  field: MeasuredField;
  volumeMl: number;
  freshness: Freshness;
  dueAt: number | null;
}

/** The volume judged: which, from where, and how old. */
export interface Choice {
  volumeMl: number;
  isSet: boolean;
  t: number;
  item: Reading["item"];
  freshness: Freshness;
  dueAt: number | null;
  notes: NoteCode[];
  beside: { volumeMl: number; item: Reading["item"]; note: NoteCode }[];
}

function newestMeasured(scene: Scene, field: MeasuredField): Measured | null {
  const items = field === "exhaledTidalVolumeMl" ? scene.line.exhaled : scene.line.spontaneous;
  const item = newestUntil(items, scene.at);
  if (!item) return null;
  const { exhaledVolumeMin } = scene.policy.intervals;
  const dueAt = scene.comfort ? null : afterInterval(scene, item.t, exhaledVolumeMin);
  const freshness = freshnessOf(scene, { row: "breaths", intervalMin: exhaledVolumeMin }, item.t, dueAt);
  return { item, field, volumeMl: item.fact[field]!, freshness, dueAt };
}

const current: Freshness = { word: "current", change: null };

const fieldBeside = (plan: VolumePlan): MeasuredField =>
  plan.beside === "spontaneous" ? "spontaneousTidalVolumeMl" : "exhaledTidalVolumeMl";

/** V6: set, and the measured one where it is fresh: beyond 10 % (A/C-VC) both are shown and the larger is judged. */
export function chooseBySet(scene: Scene, plan: VolumePlan, set: Held): Choice {
  const setMl = Number(set.value);
  const measured = newestMeasured(scene, fieldBeside(plan));
  const alone = { volumeMl: setMl, isSet: true, t: set.item.t, item: set.item, freshness: current, dueAt: null };
  if (!measured || !isFresh(measured.freshness.word)) return { ...alone, notes: ["set-volume-alone"], beside: [] };
  const { volumeMl, item, freshness, dueAt } = measured;
  const leak = plan.beside === "exhaled" && compareToLimit(volumeMl, leakBelow * setMl) < 0;
  const differs = plan.beside === "spontaneous" || differsFromSet(volumeMl, setMl);
  const notes: NoteCode[] = [...(differs ? (["exhaled-differs"] as const) : []), ...(leak ? (["leak"] as const) : [])];
  if (!differs) return { ...alone, notes, beside: [] };
  const larger = volumeMl > setMl;
  const beside = larger
    ? [{ volumeMl: setMl, item: set.item, note: "set" as const }]
    : [{ volumeMl, item, note: plan.beside! }];
  if (!larger) return { ...alone, notes, beside };
  return { volumeMl, isSet: false, t: item.t, item, freshness, dueAt, notes, beside };
}

/** V6: the exhaled volume; in SIMV-PC the larger of it and a fresh spontaneous one. */
export function chooseByExhaled(scene: Scene, plan: VolumePlan): Choice | null {
  const exhaled = newestMeasured(scene, "exhaledTidalVolumeMl");
  const besideIt = plan.beside === "spontaneous" ? newestMeasured(scene, "spontaneousTidalVolumeMl") : null;
  const spontaneous = besideIt && isFresh(besideIt.freshness.word) ? besideIt : null;
  if (!exhaled) return null;
  const larger = spontaneous && spontaneous.volumeMl > exhaled.volumeMl && isFresh(exhaled.freshness.word);
  const { item, volumeMl, freshness, dueAt } = larger ? spontaneous : exhaled;
  const alone: NoteCode[] = plan.beside === "spontaneous" && !spontaneous ? ["spontaneous-not-measured"] : [];
  return { volumeMl, isSet: false, t: item.t, item, freshness, dueAt, notes: alone, beside: [] };
}
