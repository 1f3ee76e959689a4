import type { NoteCode } from "../note-codes";
import type { DerivedName } from "../result";
import { hasCondition, type Scene } from "../scene";
import { sideOf } from "../state-of";
import type { Range } from "../targets";
import { fio2PercentJudgedAbove } from "../unit-policy-defaults";
import type { Verdict } from "./judge-series";
import { withinOrder } from "./within-order";

/** Room air: nothing left to lower. */
const roomAirPercent = 21;

/**
 * S5, F5: SpO2 and PaO2 against the order: an upper limit is judged only above FiO2 0.40 (condition *COPD*: 0.21), or
 * where FiO2 is unknown (V1); below it a value above is inside, with room to lower FiO2. Below is harmful at once.
 */
export function judgeOxygen(
  scene: Scene,
  metric: DerivedName,
  value: number,
  ordered: Range,
  fio2Percent: number | null,
): Verdict {
  const { usual, copd } = fio2PercentJudgedAbove;
  const above = hasCondition(scene.targets, "copd") ? copd : usual;
  const judgesUpper = fio2Percent === null || fio2Percent > above;
  const judged = judgesUpper ? ordered : { min: ordered.min };
  const side = sideOf(value, ordered);
  const room = !judgesUpper && side === "above" && fio2Percent > roomAirPercent;
  const notes: NoteCode[] = room ? ["room-to-lower-fio2"] : [];
  const onlyUpper = !judgesUpper && (ordered.min === undefined || ordered.min === null);
  const state = onlyUpper ? "inside" : withinOrder(metric, value, ordered, judged);
  return { state, notes, harmful: side === "below" };
}
