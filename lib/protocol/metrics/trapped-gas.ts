import { intrinsicPeepCmH2O } from "../../physiology/intrinsic-peep-cm-h2o";
import type { MechanicsFact } from "../facts";
import { dueAfterChange } from "../due/due-after-change";
import { firstChangeAfter } from "../freshness";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import { withinOrder } from "../judge/within-order";
import { hasCondition, settingsAt, type Scene } from "../scene";
import { numberInForce } from "../timeline/fold-settings";
import { countUntil, type Item } from "../timeline/item";
import { trappedGasMaxCmH2O } from "../unit-policy-defaults";
import { afterInterval } from "./after-interval";
import { pressureAgeing } from "./plateau";
import { settingInput } from "./setting-input";

const named = {
  name: "intrinsicPeepCmH2O",
  unit: "cmH2O",
  source: "total PEEP of an expiratory hold minus set PEEP; standard definition",
} as const;

function read(scene: Scene, item: Item<MechanicsFact>): Reading {
  const totalPeepCmH2O = item.fact.totalPeepCmH2O!;
  const snapshot = settingsAt(scene, item.t);
  const peepCmH2O = numberInForce(snapshot, "peepCmH2O");
  const total = { name: "totalPeepCmH2O", value: totalPeepCmH2O, unit: "cmH2O", item };
  const inputs = [total, ...settingInput(snapshot, "peepCmH2O", "cmH2O")];
  const value = peepCmH2O === null ? null : computable(() => intrinsicPeepCmH2O({ totalPeepCmH2O, peepCmH2O }));
  return { t: item.t, item, value, inputs, notes: value === null ? ["not-computable"] : [] };
}

/** S8: under *obstructive* or *copd* trapped gas has a limit of its own. */
function trappedGasLimit(scene: Scene): Judged["limit"] {
  return hasCondition(scene.targets, "obstructive", "copd") ? { max: trappedGasMaxCmH2O } : null;
}

/** V14, S8: trapped gas; with total PEEP a little below set it is 0. */
export function judgeTrappedGas(scene: Scene): Judged {
  const limit = trappedGasLimit(scene);
  if (!scene.settings) return { ...missing(named, limit), notes: ["not-computable"] };
  const { totalPeeps } = scene.line;
  const { pressuresMin, holdAfterChangeMin } = scene.policy.intervals;
  const judged = judgeSeries(scene, {
    named,
    limit,
    count: countUntil(totalPeeps, scene.at),
    read: (index) => read(scene, totalPeeps[index]!),
    ageing: pressureAgeing(scene),
    dueAt: ({ t }) => {
      const changed = firstChangeAfter(scene, "pressures", t)?.t ?? null;
      return dueAfterChange(scene, afterInterval(scene, t, pressuresMin), changed, holdAfterChangeMin);
    },
    verdict: ({ value }) => ({ state: withinOrder("intrinsicPeepCmH2O", value!, limit!) }),
  });
  return scene.asksPlateau ? judged : notAsked(judged);
}
