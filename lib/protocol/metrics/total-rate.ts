import { minuteMs } from "../instant";
import { judgeSeries } from "../judge/judge-series";
import { notAsked, type Judged } from "../judge/judged";
import { orderedRange, withinOrder } from "../judge/within-order";
import type { MechanicsFact, ObservationFact } from "../facts";
import type { Scene } from "../scene";
import { countUntil, newestUntil, type Item } from "../timeline/item";
import { afterInterval } from "./after-interval";

const named = { name: "respiratoryRateTotal", unit: "/min", source: "counted or read at the bedside" } as const;

/** V7: the newer of mechanics and observations; not asked in HFOV (V9). */
export function judgeTotalRate(scene: Scene): Judged {
  const limit = orderedRange(scene.targets.respiratoryRate);
  const { totalRates } = scene.line;
  const { totalRateMin } = scene.policy.intervals;
  const judged = judgeSeries(scene, {
    named,
    limit,
    count: countUntil(totalRates, scene.at),
    read: (index) => {
      const item = totalRates[index]!;
      const value = item.fact.respiratoryRateTotal!;
      return { t: item.t, item, value, inputs: [{ name: named.name, value, unit: named.unit, item }] };
    },
    ageing: { row: "breaths", intervalMin: totalRateMin },
    dueAt: ({ t }) => afterInterval(scene, t, totalRateMin),
    verdict: ({ value }) => ({ state: withinOrder("respiratoryRateTotal", value!, limit!) }),
  });
  return scene.mode === "HFOV" ? notAsked(judged) : judged;
}

/** V5, V7: the total rate known at a moment: not expired and not lapsed by then; null when unknown. */
export function totalRateAt(scene: Scene, t: number): Item<MechanicsFact | ObservationFact> | null {
  const item = newestUntil(scene.line.totalRates, t);
  if (!item) return null;
  const { breaths } = scene.line.changes;
  const expired = countUntil(breaths, t) > countUntil(breaths, item.t);
  const lapsed = scene.clock.between(item.t, t) >= 2 * scene.policy.intervals.totalRateMin * minuteMs;
  return expired || lapsed ? null : item;
}
