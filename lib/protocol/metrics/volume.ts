import { foresee, isFresh } from "../freshness";
import { missing, notAsked, type Judged } from "../judge/judged";
import type { Alternative, Input, Reading } from "../judge/reading";
import { volumePlanOf } from "../modes-asked";
import type { NoteCode } from "../note-codes";
import type { MechanicsFact } from "../facts";
import type { Scene } from "../scene";
import type { VolumePoint } from "../timeline/volume-points";
import { chooseByExhaled, chooseBySet, type Choice } from "./choose-volume";
import { isJudgedInMl, judgeVolumeMl, volumeLimit, type VolumeVerdict } from "./judge-volume";
import { volumeExcursionsAfter, volumeRun, type VolumeRun } from "./volume-run";

const source = "ARDS Network, N Engl J Med 2000;342:1301; predicted body weight from height and sex";

function inputsOf(scene: Scene, item: Reading["item"], volumeMl: number, isSet: boolean): Input[] {
  const spontaneous = !isSet && (item.fact as MechanicsFact).exhaledTidalVolumeMl !== volumeMl;
  const name = isSet ? "tidalVolumeMl" : spontaneous ? "spontaneousTidalVolumeMl" : "exhaledTidalVolumeMl";
  const own = { name, value: volumeMl, unit: "mL", item };
  const { height, heightCm } = scene.pbw;
  return height ? [own, { name: "heightCm", value: heightCm, unit: "cm", item: height }] : [own];
}

function readingOf(scene: Scene, point: Pick<VolumePoint, "t" | "item" | "volumeMl" | "isSet">): Reading {
  const { value } = judgeVolumeMl(scene, point.volumeMl, point.isSet);
  const inputs = inputsOf(scene, point.item, point.volumeMl, point.isSet);
  return { t: point.t, item: point.item, value, inputs };
}

function weightNotes(scene: Scene): NoteCode[] {
  const { pbwKg, alternatives, extrapolated } = scene.pbw;
  if (isJudgedInMl(scene)) return ["as-volume-in-ml"];
  const beyond: NoteCode[] = extrapolated ? ["pbw-extrapolated"] : [];
  if (pbwKg !== null) return beyond;
  return [...beyond, alternatives ? "needs-sex" : "needs-height"];
}

function alternativesOf(scene: Scene, choice: Choice, verdict: VolumeVerdict): Alternative[] {
  const beside = choice.beside.map(({ volumeMl, item, note }) => ({
    value: judgeVolumeMl(scene, volumeMl, note === "set").value,
    item,
    note,
  }));
  if (!verdict.alternatives) return beside;
  const { male, female } = verdict.alternatives;
  const { item } = choice;
  return [...beside, { value: male, item, note: "male" }, { value: female, item, note: "female" }];
}

/** F7: state of what was last judged; a measured volume last outside holds though the set one is inside. */
function lastOf(scene: Scene, run: VolumeRun): Pick<Judged, "last" | "lastState" | "run"> {
  const last = run.held ?? run.last;
  const lastState = run.run ? "outside" : run.lastState;
  return { last: last && readingOf(scene, last), lastState, run: run.run };
}

function judgeChoice(scene: Scene, base: Judged, choice: Choice, run: VolumeRun): Judged {
  const verdict = judgeVolumeMl(scene, choice.volumeMl, choice.isSet);
  const noWeight = verdict.value === null && !verdict.alternatives;
  const readable = isFresh(choice.freshness.word) && !noWeight;
  const reading = readable ? readingOf(scene, choice) : null;
  const heldOutside = readable && verdict.state !== "outside" && run.held !== null;
  foresee(scene, choice.dueAt);
  const judged: Judged = {
    ...base,
    ...lastOf(scene, run),
    state: base.limit && ((readable ? verdict.state : null) ?? "unmeasured"),
    freshness: noWeight ? "missing" : choice.freshness.word,
    change: choice.freshness.change,
    dueAt: choice.dueAt,
    reading,
    notes: [...choice.notes, ...weightNotes(scene)],
    alternatives: alternativesOf(scene, choice, verdict),
  };
  if (heldOutside) return { ...judged, notes: [...judged.notes, "exhaled-outside-not-measured-since"] };
  const judgeable = verdict.state !== null || base.limit === null;
  return readable && judgeable ? { ...judged, last: reading, lastState: verdict.state } : judged;
}

/** V6, V12, F7, S2: the volume judged, in mL/kg, or in mL by an order in mL. */
export function judgeVolume(scene: Scene): Judged {
  const named = { name: "vtMlPerKg", unit: isJudgedInMl(scene) ? "mL" : "mL/kg", source } as const;
  const excursionsAfter = (t: number) => volumeExcursionsAfter(scene, t);
  const base = { ...missing(named, volumeLimit(scene)), excursionsAfter };
  const run = volumeRun(scene);
  const unread = { ...base, ...lastOf(scene, run) };
  if (!scene.settings) return { ...base, notes: ["not-computable"] };
  const plan = volumePlanOf(scene.settings.mode);
  if (!plan) return notAsked(unread);
  const set = scene.settings.values.tidalVolumeMl;
  if (plan.base === "set" && !set) return { ...unread, notes: ["not-computable"] };
  const choice = plan.base === "set" ? chooseBySet(scene, plan, set!) : chooseByExhaled(scene, plan);
  return choice ? judgeChoice(scene, base, choice, run) : { ...unread, notes: weightNotes(scene) };
}
