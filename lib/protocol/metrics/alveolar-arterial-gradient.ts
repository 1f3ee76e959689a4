import { alveolarArterialGradientMmHg } from "../../physiology/alveolar-arterial-gradient-mm-hg";
import { gasAgeing, gasDueAt } from "../due/due-gas";
import type { BloodGasFact } from "../facts";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import type { Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import type { Scene } from "../scene";
import { countUntil, type Item } from "../timeline/item";
import { atGas } from "./gas-fio2";

const named = {
  name: "alveolarArterialGradientMmHg",
  unit: "mmHg",
  source: "alveolar gas equation, short form, respiratory quotient 0.8; standard physiology",
} as const;

const respiratoryQuotient = 0.8;

function read(scene: Scene, item: Item<BloodGasFact>): Reading {
  const { pao2MmHg, paco2MmHg } = item.fact;
  const fio2 = atGas(scene, item, "fio2");
  const { barometricPressureMmHg } = scene.policy;
  const inputs = [
    { name: "pao2MmHg", value: pao2MmHg ?? null, unit: "mmHg", item },
    { name: "paco2MmHg", value: paco2MmHg ?? null, unit: "mmHg", item },
    fio2,
    { name: "barometricPressureMmHg", value: barometricPressureMmHg, unit: "mmHg", item: null },
  ].filter((input) => input !== null);
  const base = { t: item.t, item, inputs };
  if (typeof pao2MmHg !== "number" || typeof paco2MmHg !== "number" || !fio2) return { ...base, value: null };
  const gas = { pao2MmHg, paco2MmHg, fio2: fio2.value!, barometricPressureMmHg, respiratoryQuotient };
  const value = computable(() => alveolarArterialGradientMmHg(gas));
  return { ...base, value, notes: value === null ? ["not-computable"] : [] };
}

/** V5: from one gas and the FiO2 running when it was drawn. */
export function judgeAlveolarArterialGradient(scene: Scene): Judged {
  const { pao2 } = scene.line;
  const ageing = gasAgeing(scene, "oxygen");
  return judgeSeries(scene, {
    named,
    limit: null,
    count: countUntil(pao2, scene.at),
    read: (index) => read(scene, pao2[index]!),
    ageing,
    dueAt: ({ t }) => gasDueAt(scene, ageing, t, false),
  });
}
