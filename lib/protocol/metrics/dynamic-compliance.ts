import { dynamicComplianceMlPerCmH2O } from "../../physiology/dynamic-compliance-ml-per-cm-h2o";
import type { MechanicsFact } from "../facts";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import { totalPeepOf } from "../judge/total-peep-of";
import { volumePlanOf } from "../modes-asked";
import type { Scene } from "../scene";
import { countUntil, type Item } from "../timeline/item";
import { afterInterval } from "./after-interval";
import { volumeAt } from "./volume-at";

const named = {
  name: "dynamicComplianceMlPerCmH2O",
  unit: "mL/cmH2O",
  source: "volume over peak minus total PEEP; standard physiology",
} as const;

function read(scene: Scene, item: Item<MechanicsFact>): Reading {
  const peakCmH2O = item.fact.peakCmH2O!;
  const peep = totalPeepOf(scene, item);
  const { volumeMl, inputs: volumeInputs } = volumeAt(scene, item);
  const inputs = [{ name: "peakCmH2O", value: peakCmH2O, unit: "cmH2O", item }, ...peep.inputs, ...volumeInputs];
  const base = { t: item.t, item, inputs };
  if (peep.value === null || volumeMl === null) return { ...base, value: null, notes: peep.notes };
  const paired = { tidalVolumeMl: volumeMl, peakCmH2O, totalPeepCmH2O: peep.value };
  const value = computable(() => dynamicComplianceMlPerCmH2O(paired));
  return { ...base, value, notes: value === null ? [...peep.notes, "not-computable"] : peep.notes };
}

/** V4, V5: volume at the reading over its peak minus total PEEP. */
export function judgeDynamicCompliance(scene: Scene): Judged {
  if (!scene.settings) return { ...missing(named, null), notes: ["not-computable"] };
  const { peaks } = scene.line;
  const { pressuresMin } = scene.policy.intervals;
  const judged = judgeSeries(scene, {
    named,
    limit: null,
    count: countUntil(peaks, scene.at),
    read: (index) => read(scene, peaks[index]!),
    ageing: { row: "flow", intervalMin: pressuresMin },
    dueAt: (newest) => afterInterval(scene, newest.t, pressuresMin),
  });
  return volumePlanOf(scene.settings.mode) ? judged : notAsked(judged);
}
