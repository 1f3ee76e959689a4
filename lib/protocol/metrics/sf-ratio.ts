import { compareToLimit } from "../compare-to-limit";
import { sfRatio } from "../../physiology/sf-ratio";
import { spo2Ageing, spo2DueAt } from "../due/due-spo2";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import type { Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import { settingsAt, type Scene } from "../scene";
import { countUntil } from "../timeline/item";
import { settingInput } from "./setting-input";

const named = {
  name: "sfRatio",
  unit: "",
  source: "Rice, Chest 2007;132:410; Matthay, Am J Respir Crit Care Med 2024;209:37",
} as const;

/** Above this SpO2 (percent) the ratio is not usable for severity; Rice 2007. */
const usableUpTo = 97;

function read(scene: Scene, index: number): Reading {
  const item = scene.line.spo2[index]!;
  const spo2Percent = item.fact.spo2Percent!;
  const own = { name: "spo2Percent", value: spo2Percent, unit: "%", item };
  const fio2 = settingInput(settingsAt(scene, item.t), "fio2", "fraction");
  const fraction = fio2[0]?.value ?? null;
  const value = fraction === null ? null : computable(() => sfRatio({ spo2Percent, fio2: fraction }));
  const base = { t: item.t, item, value, inputs: [own, ...fio2] };
  if (value === null) return { ...base, notes: ["not-computable"] };
  return { ...base, notes: compareToLimit(spo2Percent, usableUpTo) > 0 ? ["spo2-above-97"] : [] };
}

/** V5: SpO2 over the FiO2 in force when it was read. */
export function judgeSfRatio(scene: Scene): Judged {
  const dueAt = spo2DueAt(scene);
  return judgeSeries(scene, {
    named,
    limit: null,
    count: countUntil(scene.line.spo2, scene.at),
    read: (index) => read(scene, index),
    ageing: spo2Ageing(scene),
    dueAt: () => dueAt,
  });
}
