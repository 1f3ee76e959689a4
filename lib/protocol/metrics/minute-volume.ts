import { minuteVolumeLPerMin } from "../../physiology/minute-volume-l-per-min";
import type { MechanicsFact } from "../facts";
import { compareToLimit } from "../compare-to-limit";
import { isFresh } from "../freshness";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import { isNonInvasive } from "../modes-asked";
import { settingsAt, type Scene } from "../scene";
import { countUntil, type Item } from "../timeline/item";
import { afterInterval } from "./after-interval";
import { settingInput } from "./setting-input";
import { totalRateAt } from "./total-rate";

const named = { name: "minuteVolumeLPerMin", unit: "L/min", source: "tidal volume times rate; definition" } as const;

/** V7: the patient triggers where the total rate is more than this above the set one. */
const triggersBeyond = 1;

export function readMeasured(item: Item<MechanicsFact>): Reading {
  const value = item.fact.minuteVolumeLPerMin!;
  return { t: item.t, item, value, inputs: [{ name: named.name, value, unit: named.unit, item }] };
}

/** V7: exhaled volume × total rate of one reading. In SIMV the exhaled volume is the mandatory breaths' alone. */
export function readProduct(item: Item<MechanicsFact>): Reading {
  const exhaled = item.fact.exhaledTidalVolumeMl!;
  const rate = item.fact.respiratoryRateTotal!;
  const value = computable(() => minuteVolumeLPerMin({ tidalVolumeMl: exhaled, respiratoryRate: rate }));
  const inputs = [
    { name: "exhaledTidalVolumeMl", value: exhaled, unit: "mL", item },
    { name: "respiratoryRateTotal", value: rate, unit: "/min", item },
  ];
  return { t: item.t, item, value, inputs, notes: [value === null ? "not-computable" : "exhaled-times-rate"] };
}

/** V7: set volume × set rate, only where the total rate is unknown or at most one above the set one. */
export function readSet(scene: Scene, t: number): Reading | null {
  const snapshot = settingsAt(scene, t);
  const inputs = [
    ...settingInput(snapshot, "tidalVolumeMl", "mL"),
    ...settingInput(snapshot, "respiratoryRate", "/min"),
  ];
  const [volume, rate] = inputs;
  if (!snapshot || !volume || !rate || inputs.length !== 2 || volume.name !== "tidalVolumeMl") return null;
  const total = totalRateAt(scene, t)?.fact.respiratoryRateTotal ?? null;
  if (total !== null && compareToLimit(total, rate.value! + triggersBeyond) > 0) return null;
  const value = computable(() => minuteVolumeLPerMin({ tidalVolumeMl: volume.value!, respiratoryRate: rate.value! }));
  return { t: snapshot.t, item: snapshot.item, value, inputs, notes: ["set-times-set"] };
}

function judgeReadings(
  scene: Scene,
  items: readonly Item<MechanicsFact>[],
  read: (item: Item<MechanicsFact>) => Reading,
) {
  const { exhaledVolumeMin } = scene.policy.intervals;
  return judgeSeries(scene, {
    named,
    limit: null,
    count: countUntil(items, scene.at),
    read: (index) => read(items[index]!),
    ageing: { row: "breaths", intervalMin: exhaledVolumeMin },
    dueAt: ({ t }) => afterInterval(scene, t, exhaledVolumeMin),
  });
}

/** V7: measured, else exhaled × total rate of one reading, else set × set; what is not fresh gives way. */
export function judgeMinuteVolume(scene: Scene): Judged {
  if (!scene.settings) return { ...missing(named, null), notes: ["not-computable"] };
  const measured = judgeReadings(scene, scene.line.minuteVolumes, readMeasured);
  const { mode } = scene.settings;
  if (isNonInvasive(mode) || mode === "HFOV") return notAsked(measured);
  if (isFresh(measured.freshness)) return measured;
  const product = judgeReadings(scene, scene.line.exhaledWithRate, readProduct);
  if (isFresh(product.freshness)) return product;
  const set = readSet(scene, scene.at);
  if (set) return { ...missing(named, null), freshness: "current", reading: set, last: set, notes: set.notes ?? [] };
  return (measured.last?.t ?? 0) >= (product.last?.t ?? 0) ? measured : product;
}
