import { rapidShallowBreathingIndex } from "../../physiology/rapid-shallow-breathing-index";
import type { MechanicsFact, TherapyFact } from "../facts";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { notAsked, type Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import { minuteMs } from "../instant";
import type { Scene } from "../scene";
import { countUntil, type Item } from "../timeline/item";
import { afterInterval } from "./after-interval";
import { totalRateAt } from "./total-rate";

const named = {
  name: "rapidShallowBreathingIndex",
  unit: "/min/L",
  source: "Yang and Tobin, N Engl J Med 1991;324:1445",
} as const;

/** A spontaneous breathing trial lasts up to this (min), unless its end is charted. ARDS Network, from memory. */
const longestTrialMin = 120;

/** V10: within an unsupported trial: from its start until its end or the next trial's entry. */
function inUnsupportedTrial(scene: Scene, t: number): boolean {
  let trial: Item<TherapyFact> | null = null;
  for (const item of scene.line.therapies) {
    if (item.t > t) break;
    if (item.fact.therapy === "sbt") trial = item;
  }
  if (!trial?.fact.unsupported) return false;
  return t - trial.t <= (trial.fact.minutes ?? longestTrialMin) * minuteMs;
}

function read(scene: Scene, item: Item<MechanicsFact>): Reading {
  const { spontaneousTidalVolumeMl, exhaledTidalVolumeMl } = item.fact;
  const name = typeof spontaneousTidalVolumeMl === "number" ? "spontaneousTidalVolumeMl" : "exhaledTidalVolumeMl";
  const volumeMl = spontaneousTidalVolumeMl ?? exhaledTidalVolumeMl!;
  const rate = totalRateAt(scene, item.t);
  const base = { t: item.t, item, value: null, inputs: [{ name, value: volumeMl, unit: "mL", item }] };
  if (!rate || !inUnsupportedTrial(scene, item.t)) return base;
  const perMin = rate.fact.respiratoryRateTotal!;
  const value = computable(() => rapidShallowBreathingIndex({ respiratoryRate: perMin, tidalVolumeMl: volumeMl }));
  const inputs = [...base.inputs, { name: "respiratoryRateTotal", value: perMin, unit: "/min", item: rate }];
  return { ...base, value, inputs, notes: value === null ? ["not-computable"] : [] };
}

/** V10: only in an unsupported spontaneous breathing trial. */
export function judgeRapidShallowBreathingIndex(scene: Scene): Judged {
  const { breathVolumes, therapies } = scene.line;
  const everTried = therapies.some(({ t, fact }) => t <= scene.at && fact.unsupported === true);
  const { exhaledVolumeMin } = scene.policy.intervals;
  const judged = judgeSeries(scene, {
    named,
    limit: null,
    count: everTried ? countUntil(breathVolumes, scene.at) : 0,
    read: (index) => read(scene, breathVolumes[index]!),
    ageing: { row: "breaths", intervalMin: exhaledVolumeMin },
    dueAt: ({ t }) => afterInterval(scene, t, exhaledVolumeMin),
  });
  return inUnsupportedTrial(scene, scene.at) ? judged : notAsked({ ...judged, reading: null });
}
