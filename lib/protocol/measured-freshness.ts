import { holdDueAt } from "./due/due-hold";
import { spo2Ageing, spo2DueAt } from "./due/due-spo2";
import { freshnessOf, type Ageing } from "./freshness";
import { isoOf } from "./instant";
import { afterInterval } from "./metrics/after-interval";
import type { MeasuredFreshness } from "./result";
import type { Scene } from "./scene";
import type { Timeline } from "./timeline/timeline";
import type { ExpiryRow } from "./timeline/expiry-rows";
import { newestUntil } from "./timeline/item";

type Interval = "pressuresMin" | "exhaledVolumeMin" | "totalRateMin";

/** F6, F2: which row and interval each measured field ages by. */
const fields: Record<string, { readings: keyof Timeline; row: ExpiryRow; interval: Interval }> = {
  exhaledTidalVolumeMl: { readings: "exhaled", row: "breaths", interval: "exhaledVolumeMin" },
  spontaneousTidalVolumeMl: { readings: "spontaneous", row: "breaths", interval: "exhaledVolumeMin" },
  respiratoryRateTotal: { readings: "totalRates", row: "breaths", interval: "totalRateMin" },
  minuteVolumeLPerMin: { readings: "minuteVolumes", row: "breaths", interval: "exhaledVolumeMin" },
  meanAirwayPressureCmH2O: { readings: "meanPressures", row: "breaths", interval: "pressuresMin" },
  peakCmH2O: { readings: "peaks", row: "flow", interval: "pressuresMin" },
  totalPeepCmH2O: { readings: "totalPeeps", row: "pressures", interval: "pressuresMin" },
  plateauCmH2O: { readings: "plateaus", row: "pressures", interval: "pressuresMin" },
  etco2MmHg: { readings: "etco2", row: "carbonDioxide", interval: "pressuresMin" },
};

function freshnessAt(scene: Scene, t: number | null, ageing: Ageing, dueAt: number | null): MeasuredFreshness {
  const { word, change } =
    t === null ? { word: "missing" as const, change: null } : freshnessOf(scene, ageing, t, dueAt);
  return {
    freshness: word,
    changedAt: isoOf(change?.t),
    changedByEntryId: change?.entryId ?? null,
    changedBy: change?.by ?? null,
    dueAt: isoOf(dueAt),
    chartedAt: isoOf(t),
  };
}

/** F1, F6: how fresh each measured field is, also those without a derived number of their own. */
export function measuredFreshness(scene: Scene): Record<string, MeasuredFreshness> {
  const answer: Record<string, MeasuredFreshness> = {};
  for (const [field, { readings, row, interval }] of Object.entries(fields)) {
    const t = newestUntil(scene.line[readings] as { t: number }[], scene.at)?.t ?? null;
    const intervalMin = scene.policy.intervals[interval];
    const byInterval = t === null || scene.comfort ? null : afterInterval(scene, t, intervalMin);
    const dueAt = field === "plateauCmH2O" ? holdDueAt(scene) : byInterval;
    answer[field] = freshnessAt(scene, t, { row, intervalMin }, dueAt);
  }
  const spo2 = newestUntil(scene.line.spo2, scene.at)?.t ?? null;
  answer.spo2Percent = freshnessAt(scene, spo2, spo2Ageing(scene), spo2DueAt(scene));
  return answer;
}
