import { spo2Ageing, spo2DueAt } from "../due/due-spo2";
import { judgeSeries } from "../judge/judge-series";
import type { Judged } from "../judge/judged";
import { judgeOxygen } from "../judge/oxygen-limit";
import { orderedRange } from "../judge/within-order";
import { fio2PercentAt, type Scene } from "../scene";
import { countUntil } from "../timeline/item";

const named = { name: "spo2Percent", unit: "%", source: "pulse oximeter" } as const;

/** F5, S5: the newest SpO2. */
export function judgeSpo2(scene: Scene): Judged {
  const limit = orderedRange(scene.targets.spo2Percent);
  const { spo2 } = scene.line;
  const dueAt = spo2DueAt(scene);
  return judgeSeries(scene, {
    named,
    limit,
    count: countUntil(spo2, scene.at),
    read: (index) => {
      const item = spo2[index]!;
      const value = item.fact.spo2Percent!;
      const inputs = [{ ...named, value, item }];
      return { t: item.t, item, value, inputs, fio2Percent: fio2PercentAt(scene, item.t) };
    },
    ageing: spo2Ageing(scene),
    dueAt: () => dueAt,
    firstDueAt: dueAt,
    verdict: ({ value, fio2Percent = null }, now) =>
      judgeOxygen(scene, named.name, value!, limit!, now ? fio2PercentAt(scene, scene.at) : fio2Percent),
  });
}
