import { newestHold } from "../due/due-hold";
import { judgeSeries } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import type { Reading } from "../judge/reading";
import { orderedRange, withinOrder } from "../judge/within-order";
import { asksPower } from "../modes-asked";
import type { Scene } from "../scene";
import type { PowerReading } from "../timeline/power-readings";
import { countUntil } from "../timeline/item";
import { afterInterval } from "./after-interval";
import { metEffort } from "./plateau";
import { readPressureControl, readVolumeControl } from "./power-reading";

const volumeForm = {
  name: "mechanicalPowerJPerMin",
  unit: "J/min",
  source: "Gattinoni, Intensive Care Med 2016;42:1567, simplified form for volume control",
} as const;
const pressureForm = {
  ...volumeForm,
  source: "Becher, Intensive Care Med 2019;45:1321 (from memory), simplified form for pressure control",
} as const;

/** V8: unmeasured while a hold with effort is the newest one. */
function whileRelaxed(scene: Scene, reading: Reading): Reading {
  const hold = newestHold(scene);
  return hold && metEffort(hold) ? { ...reading, value: null, effort: true, notes: ["patient-effort"] } : reading;
}

/** V10: volume form in A/C-VC, pressure form in A/C-PC and A/C-vtPC; elsewhere not asked. */
export function judgePower(scene: Scene): Judged {
  const limit = orderedRange(scene.targets.mechanicalPowerJPerMin);
  if (!scene.settings) return { ...missing(volumeForm, limit), notes: ["not-computable"] };
  const { mode } = scene.settings;
  const { powerReadings } = scene.line;
  const count = countUntil(powerReadings, scene.at);
  const { pressuresMin } = scene.policy.intervals;
  const read = ({ hold, item }: PowerReading) =>
    hold ? readVolumeControl(scene, hold) : readPressureControl(scene, item!);
  const judged = judgeSeries(scene, {
    named: mode === "A/C-VC" ? volumeForm : pressureForm,
    limit,
    count,
    read: (index) => {
      const reading = read(powerReadings[index]!);
      return index === count - 1 ? whileRelaxed(scene, reading) : reading;
    },
    ageing: { row: "power", intervalMin: pressuresMin },
    dueAt: ({ t }) => afterInterval(scene, t, pressuresMin),
    verdict: ({ value }) => ({ state: withinOrder("mechanicalPowerJPerMin", value!, limit!) }),
  });
  return asksPower(mode) ? judged : notAsked(judged);
}
