import type { BloodGasFact } from "../facts";
import { firstGasDueAt, gasAgeing, gasDueAt, gasesAsNeeded } from "../due/due-gas";
import { judgeSeries, type Verdict } from "../judge/judge-series";
import { notAsked, type Judged } from "../judge/judged";
import { judgeOxygen } from "../judge/oxygen-limit";
import { orderedRange, withinOrder } from "../judge/within-order";
import { fio2PercentAt, type Scene } from "../scene";
import type { Range } from "../targets";
import type { ExpiryRow } from "../timeline/expiry-rows";
import { countUntil, type Item } from "../timeline/item";
import { gasFio2Percent } from "./gas-fio2";

type GasMetric = "pao2MmHg" | "paco2MmHg" | "ph";

const source = "arterial blood gas";
const named = {
  pao2MmHg: { name: "pao2MmHg", unit: "mmHg", source },
  paco2MmHg: { name: "paco2MmHg", unit: "mmHg", source },
  ph: { name: "ph", unit: "", source },
} as const;

const rowOf: Record<GasMetric, ExpiryRow> = { pao2MmHg: "oxygen", paco2MmHg: "carbonDioxide", ph: "carbonDioxide" };

function judgeGasValue(
  scene: Scene,
  metric: GasMetric,
  gases: readonly Item<BloodGasFact>[],
  verdict: (value: number, limit: Range, fio2Percent: number | null) => Verdict,
): Judged {
  const limit = orderedRange(scene.targets[metric]);
  const ageing = gasAgeing(scene, rowOf[metric]);
  const judged = judgeSeries(scene, {
    named: named[metric],
    limit,
    count: countUntil(gases, scene.at),
    read: (index) => {
      const item = gases[index]!;
      const value = item.fact[metric]!;
      const fio2Percent = metric === "pao2MmHg" ? gasFio2Percent(scene, item) : null;
      return { t: item.t, item, value, fio2Percent, inputs: [{ ...named[metric], value, item }] };
    },
    ageing,
    dueAt: ({ t }, lastOutside) => gasDueAt(scene, ageing, t, lastOutside),
    firstDueAt: firstGasDueAt(scene),
    verdict: ({ value, fio2Percent = null }, now) =>
      verdict(value!, limit!, now ? fio2PercentAt(scene, scene.at) : fio2Percent),
  });
  // F2: ordered 'as needed', a missing gas is not asked.
  return limit && judged.freshness === "missing" && gasesAsNeeded(scene) ? notAsked(judged) : judged;
}

/** S5, F5: PaO2; below the order is harmful. */
export function judgePao2(scene: Scene): Judged {
  return judgeGasValue(scene, "pao2MmHg", scene.line.pao2, (value, limit, fio2Percent) =>
    judgeOxygen(scene, "pao2MmHg", value, limit, fio2Percent),
  );
}

function judgeEitherSide(metric: "paco2MmHg" | "ph", value: number, limit: Range): Verdict {
  const state = withinOrder(metric, value, limit);
  return { state, harmful: state === "outside" };
}

/** F5: PaCO2; outside is harmful on either side. */
export function judgePaco2(scene: Scene): Judged {
  return judgeGasValue(scene, "paco2MmHg", scene.line.paco2, (value, limit) =>
    judgeEitherSide("paco2MmHg", value, limit),
  );
}

/** F5: pH; outside is harmful on either side. */
export function judgePh(scene: Scene): Judged {
  return judgeGasValue(scene, "ph", scene.line.ph, (value, limit) => judgeEitherSide("ph", value, limit));
}
