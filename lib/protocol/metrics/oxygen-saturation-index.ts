import { oxygenSaturationIndex } from "../../physiology/oxygen-saturation-index";
import { spo2Ageing, spo2DueAt } from "../due/due-spo2";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { notAsked, type Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import { isNonInvasive } from "../modes-asked";
import { settingsAt, type Scene } from "../scene";
import { countUntil } from "../timeline/item";
import { hasMeanPressure, meanPressureAt } from "./mean-pressure-at";
import { settingInput } from "./setting-input";

const named = { name: "oxygenSaturationIndex", unit: "", source: "DesPrez, Chest 2017;152:1151" } as const;

function read(scene: Scene, index: number): Reading {
  const item = scene.line.spo2[index]!;
  const spo2Percent = item.fact.spo2Percent!;
  const fio2 = settingInput(settingsAt(scene, item.t), "fio2", "fraction")[0] ?? null;
  const mean = meanPressureAt(scene, item.t);
  const own = { name: "spo2Percent", value: spo2Percent, unit: "%", item };
  const base = { t: item.t, item, inputs: [own, fio2, mean].filter((input) => input !== null) };
  if (!fio2 || !mean) return { ...base, value: null };
  const value = computable(() =>
    oxygenSaturationIndex({ spo2Percent, fio2: fio2.value!, meanAirwayPressureCmH2O: mean.value! }),
  );
  return { ...base, value, notes: value === null ? ["not-computable"] : [] };
}

/** V5: from SpO2 with the FiO2 and mean airway pressure that belong to it. */
export function judgeOxygenSaturationIndex(scene: Scene): Judged {
  const dueAt = spo2DueAt(scene);
  const judged = judgeSeries(scene, {
    named,
    limit: null,
    count: hasMeanPressure(scene) ? countUntil(scene.line.spo2, scene.at) : 0,
    read: (index) => read(scene, index),
    ageing: spo2Ageing(scene),
    dueAt: () => dueAt,
  });
  return scene.mode && isNonInvasive(scene.mode) ? notAsked(judged) : judged;
}
