import { oxygenationIndex } from "../../physiology/oxygenation-index";
import { gasAgeing, gasDueAt } from "../due/due-gas";
import type { BloodGasFact } from "../facts";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { notAsked, type Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import { isNonInvasive } from "../modes-asked";
import type { Scene } from "../scene";
import { countUntil, type Item } from "../timeline/item";
import { atGas } from "./gas-fio2";
import { hasMeanPressure, meanPressureAt } from "./mean-pressure-at";

const named = { name: "oxygenationIndex", unit: "", source: "DesPrez, Chest 2017;152:1151" } as const;

function read(scene: Scene, item: Item<BloodGasFact>): Reading {
  const pao2MmHg = item.fact.pao2MmHg!;
  const fio2 = atGas(scene, item, "fio2");
  const mean = meanPressureAt(scene, item.t);
  const inputs = [{ name: "pao2MmHg", value: pao2MmHg, unit: "mmHg", item }, fio2, mean].filter(
    (input) => input !== null,
  );
  const base = { t: item.t, item, inputs };
  if (!fio2 || !mean) return { ...base, value: null };
  const value = computable(() =>
    oxygenationIndex({ pao2MmHg, fio2: fio2.value!, meanAirwayPressureCmH2O: mean.value! }),
  );
  return { ...base, value, notes: value === null ? ["not-computable"] : [] };
}

/** V5: from a gas with the FiO2 and mean airway pressure that belong to it. */
export function judgeOxygenationIndex(scene: Scene): Judged {
  const { pao2 } = scene.line;
  const ageing = gasAgeing(scene, "oxygen");
  const judged = judgeSeries(scene, {
    named,
    limit: null,
    count: hasMeanPressure(scene) ? countUntil(pao2, scene.at) : 0,
    read: (index) => read(scene, pao2[index]!),
    ageing,
    dueAt: ({ t }) => gasDueAt(scene, ageing, t, false),
  });
  return scene.mode && isNonInvasive(scene.mode) ? notAsked(judged) : judged;
}
