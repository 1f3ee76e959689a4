import { staticComplianceMlPerCmH2O } from "../../physiology/static-compliance-ml-per-cm-h2o";
import { holdDueAt } from "../due/due-hold";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import type { Scene } from "../scene";
import { readHold } from "./hold-reading";
import { plateausUntil, pressureAgeing } from "./plateau";
import { volumeAt } from "./volume-at";

const named = {
  name: "staticComplianceMlPerCmH2O",
  unit: "mL/cmH2O",
  source: "volume over driving pressure, with total PEEP; standard physiology",
} as const;

/** V4, V5, V8: volume at the reading over its driving pressure. */
export function judgeStaticCompliance(scene: Scene): Judged {
  if (!scene.settings) return { ...missing(named, null), notes: ["not-computable"] };
  const { holds, count } = plateausUntil(scene);
  const dueAt = scene.asksPlateau ? holdDueAt(scene) : null;
  const judged = judgeSeries(scene, {
    named,
    limit: null,
    count,
    read: (index) =>
      readHold(scene, holds[index]!, (paired) => {
        const { volumeMl, inputs } = volumeAt(scene, paired.item);
        if (volumeMl === null) return { value: null, inputs };
        return { value: computable(() => staticComplianceMlPerCmH2O({ ...paired, tidalVolumeMl: volumeMl })), inputs };
      }),
    ageing: pressureAgeing(scene),
    dueAt: () => dueAt,
  });
  return scene.asksPlateau ? judged : notAsked(judged);
}
