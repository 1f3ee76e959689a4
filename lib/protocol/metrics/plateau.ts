import { holdDueAt } from "../due/due-hold";
import type { Ageing } from "../freshness";
import { judgeSeries, type Verdict } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import type { Input, Reading } from "../judge/reading";
import { orderedRange, withinOrder } from "../judge/within-order";
import type { NoteCode } from "../note-codes";
import type { Scene } from "../scene";
import { sideOf } from "../state-of";
import type { Hold } from "../timeline/holds";
import { countUntil } from "../timeline/item";
import { settingInput } from "./setting-input";

const plateau = {
  name: "plateauCmH2O",
  unit: "cmH2O",
  source: "ARDS Network, N Engl J Med 2000;342:1301; end-inspiratory hold",
} as const;

/** V8: a hold that may have met effort. */
export function metEffort(hold: Hold): boolean {
  return hold.quality === "effort" || hold.quality === "unsure" || hold.quality === "unsaid";
}

/** How many holds charted a plateau by now: `not-possible` charts none, and in APRV P-high stands for it. */
export function plateausUntil(scene: Scene): { holds: readonly Hold[]; count: number } {
  const { plateaus } = scene.line;
  return { holds: plateaus, count: countUntil(plateaus, scene.at) };
}

function inputsOf(hold: Hold): Input[] {
  const own = { value: hold.plateauCmH2O, unit: "cmH2O", item: hold.item };
  if (hold.quality === "p-high") return [{ ...own, name: "pHighCmH2O" }];
  if (!hold.zeroFlow) return [{ ...own, name: "plateauCmH2O" }];
  return [
    ...settingInput(hold.snapshot, "peepCmH2O", "cmH2O"),
    ...settingInput(hold.snapshot, "pressureAbovePeepCmH2O", "cmH2O"),
  ];
}

function notesOf(hold: Hold): NoteCode[] {
  if (metEffort(hold)) return ["patient-effort"];
  if (hold.zeroFlow) return ["zero-flow"];
  return hold.quality === "p-high" ? ["p-high"] : [];
}

function readingOf(hold: Hold): Reading {
  const { t, item, plateauCmH2O: value } = hold;
  return { t, item, value, effort: metEffort(hold), notes: notesOf(hold), inputs: inputsOf(hold) };
}

/** V8: only a relaxed hold can read inside or at the edge; one with effort only above the limit. */
function verdictWithin(limit: NonNullable<Judged["limit"]>, { value, effort }: Reading): Verdict {
  if (value === null) return { state: null };
  if (effort) return { state: sideOf(value, limit) === "above" ? "outside" : null };
  return { state: withinOrder("plateauCmH2O", value, limit) };
}

export const pressureAgeing = (scene: Scene): Ageing => ({
  row: "pressures",
  intervalMin: scene.policy.intervals.pressuresMin,
});

/** V9: P-high is a set value: it neither ages nor is due. */
const setValueAgeing: Ageing = { row: null, intervalMin: 0, timeless: true };

/** V8, V9: plateau of the newest hold; P-high in APRV; not asked where the mode has none. */
export function judgePlateau(scene: Scene): Judged {
  const limit = orderedRange(scene.targets.plateauCmH2O);
  if (!scene.settings) return { ...missing(plateau, limit), notes: ["not-computable"] };
  const { holds, count } = plateausUntil(scene);
  const inAprv = scene.mode === "APRV";
  const dueAt = holdDueAt(scene);
  const judged = judgeSeries(scene, {
    named: plateau,
    limit,
    count,
    read: (index) => readingOf(holds[index]!),
    ageing: inAprv ? setValueAgeing : pressureAgeing(scene),
    dueAt: () => dueAt,
    firstDueAt: dueAt,
    verdict: (reading) => verdictWithin(limit!, reading),
  });
  return scene.asksPlateau || inAprv ? judged : notAsked(judged);
}
