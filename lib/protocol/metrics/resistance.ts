import { airwayResistanceCmH2OPerLPerS } from "../../physiology/airway-resistance-cm-h2o-per-l-per-s";
import { holdDueAt } from "../due/due-hold";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import type { MechanicsFact } from "../facts";
import type { Scene } from "../scene";
import type { Snapshot } from "../timeline/fold-settings";
import type { Hold } from "../timeline/holds";
import type { Item } from "../timeline/item";
import { metEffort, plateausUntil } from "./plateau";
import { settingInput } from "./setting-input";

const named = {
  name: "airwayResistanceCmH2OPerLPerS",
  unit: "cmH2O/(L/s)",
  source: "peak minus plateau over flow, constant inspiratory flow; equation of motion",
} as const;

/** V10: A/C-VC with constant flow: square, or not stated. */
function isConstantFlow(snapshot: Snapshot | null): boolean {
  return snapshot?.mode === "A/C-VC" && (snapshot.values.flowPattern?.value ?? "square") === "square";
}

function read({ t, item, snapshot, ...hold }: Hold): Reading {
  const base = { t, item, value: null, inputs: [] };
  if (metEffort({ t, item, snapshot, ...hold })) return { ...base, effort: true, notes: ["patient-effort"] };
  const plateauCmH2O = hold.plateauCmH2O;
  const peakCmH2O = (item as Item<MechanicsFact>).fact.peakCmH2O ?? null;
  const flow = settingInput(snapshot, "flowLPerMin", "L/min");
  const flowLPerMin = flow[0]?.value ?? null;
  if (!isConstantFlow(snapshot) || plateauCmH2O === null || peakCmH2O === null || flowLPerMin === null) return base;
  const value = computable(() => airwayResistanceCmH2OPerLPerS({ peakCmH2O, plateauCmH2O, flowLPerMin }));
  const pressures = [
    { name: "peakCmH2O", value: peakCmH2O, unit: "cmH2O", item },
    { name: "plateauCmH2O", value: plateauCmH2O, unit: "cmH2O", item },
  ];
  return { ...base, value, inputs: [...pressures, ...flow], notes: value === null ? ["not-computable"] : [] };
}

/** V10: asked in A/C-VC with constant flow only. */
export function judgeResistance(scene: Scene): Judged {
  if (!scene.settings) return { ...missing(named, null), notes: ["not-computable"] };
  const { holds, count } = plateausUntil(scene);
  const dueAt = isConstantFlow(scene.settings) ? holdDueAt(scene) : null;
  const judged = judgeSeries(scene, {
    named,
    limit: null,
    count,
    read: (index) => read(holds[index]!),
    ageing: { row: "flow", intervalMin: scene.policy.intervals.pressuresMin },
    dueAt: () => dueAt,
  });
  return isConstantFlow(scene.settings) ? judged : notAsked(judged);
}
