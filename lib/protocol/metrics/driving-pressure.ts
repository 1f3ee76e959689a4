import { drivingPressureCmH2O } from "../../physiology/driving-pressure-cm-h2o";
import { holdDueAt } from "../due/due-hold";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import { orderedRange, withinOrder } from "../judge/within-order";
import type { Scene } from "../scene";
import { readHold } from "./hold-reading";
import { plateausUntil, pressureAgeing } from "./plateau";

const named = {
  name: "drivingPressureCmH2O",
  unit: "cmH2O",
  source: "Amato, N Engl J Med 2015;372:747; a convention, no trial-proven ceiling",
} as const;

/** V4, V8: plateau minus total PEEP of the newest hold. */
export function judgeDrivingPressure(scene: Scene): Judged {
  const limit = orderedRange(scene.targets.drivingPressureCmH2O);
  if (!scene.settings) return { ...missing(named, limit), notes: ["not-computable"] };
  const { holds, count } = plateausUntil(scene);
  const dueAt = scene.asksPlateau ? holdDueAt(scene) : null;
  const judged = judgeSeries(scene, {
    named,
    limit,
    count,
    read: (index) =>
      readHold(scene, holds[index]!, (paired) => ({
        value: computable(() => drivingPressureCmH2O(paired)),
        inputs: [],
      })),
    ageing: pressureAgeing(scene),
    dueAt: () => dueAt,
    firstDueAt: dueAt,
    verdict: ({ value }) => ({ state: withinOrder("drivingPressureCmH2O", value!, limit!) }),
  });
  return scene.asksPlateau ? judged : notAsked(judged);
}
