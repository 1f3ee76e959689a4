import { mechanicalPowerPressureControlJPerMin } from "../../physiology/mechanical-power-pressure-control-j-per-min";
import { mechanicalPowerVolumeControlJPerMin } from "../../physiology/mechanical-power-volume-control-j-per-min";
import type { MechanicsFact } from "../facts";
import { newestHold } from "../due/due-hold";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import type { Input, Reading } from "../judge/reading";
import { orderedRange, withinOrder } from "../judge/within-order";
import { asksPower } from "../modes-asked";
import type { NoteCode } from "../note-codes";
import { settingsAt, type Scene } from "../scene";
import { numberInForce } from "../timeline/fold-settings";
import type { Hold } from "../timeline/holds";
import type { PowerReading } from "../timeline/power-readings";
import { countUntil, type Item } from "../timeline/item";
import { afterInterval } from "./after-interval";
import { readHold } from "./hold-reading";
import { metEffort } from "./plateau";
import { settingInput } from "./setting-input";
import { totalRateAt } from "./total-rate";
import { volumeAt } from "./volume-at";

const volumeForm = {
  name: "mechanicalPowerJPerMin",
  unit: "J/min",
  source: "Gattinoni, Intensive Care Med 2016;42:1567, simplified form for volume control",
} as const;
const pressureForm = {
  ...volumeForm,
  source: "Becher, Intensive Care Med 2019;45:1321 (from memory), simplified form for pressure control",
} as const;

interface Rate {
  perMin: number | null;
  notes: NoteCode[];
  inputs: Input[];
}

/** V5, V10: the total rate at the reading, else the set rate with its note. */
function rateAt(scene: Scene, item: Item<MechanicsFact>): Rate {
  const total = item.fact.respiratoryRateTotal !== null && item.fact.respiratoryRateTotal !== undefined;
  const source = total ? item : totalRateAt(scene, item.t);
  if (source) {
    const value = source.fact.respiratoryRateTotal!;
    return { perMin: value, notes: [], inputs: [{ name: "respiratoryRateTotal", value, unit: "/min", item: source }] };
  }
  const inputs = settingInput(settingsAt(scene, item.t), "respiratoryRate", "/min");
  return { perMin: inputs[0]?.value ?? null, notes: ["set-rate"], inputs };
}

function readVolumeControl(scene: Scene, hold: Hold): Reading {
  return readHold(scene, hold, ({ item, plateauCmH2O, totalPeepCmH2O }) => {
    const peakCmH2O = item.fact.peakCmH2O ?? null;
    const { volumeMl, inputs: volumes } = volumeAt(scene, item);
    const rate = rateAt(scene, item);
    if (peakCmH2O === null || volumeMl === null || rate.perMin === null) {
      return { value: null, inputs: [] };
    }
    const pressures = { peakCmH2O, plateauCmH2O, totalPeepCmH2O };
    const value = computable(() =>
      mechanicalPowerVolumeControlJPerMin({ ...pressures, respiratoryRate: rate.perMin!, tidalVolumeMl: volumeMl }),
    );
    const peak = { name: "peakCmH2O", value: peakCmH2O, unit: "cmH2O", item };
    return { value, notes: rate.notes, inputs: [peak, ...volumes, ...rate.inputs] };
  });
}

/** V10: pressure above PEEP as set; in A/C-vtPC peak − PEEP. */
function pressureAbove(scene: Scene, item: Item<MechanicsFact>): { cmH2O: number | null; inputs: Input[] } {
  const snapshot = settingsAt(scene, item.t);
  if (snapshot?.mode === "A/C-PC") {
    const inputs = settingInput(snapshot, "pressureAbovePeepCmH2O", "cmH2O");
    return { cmH2O: inputs[0]?.value ?? null, inputs };
  }
  const peak = item.fact.peakCmH2O ?? null;
  const peep = numberInForce(snapshot, "peepCmH2O");
  if (snapshot?.mode !== "A/C-vtPC" || peak === null || peep === null) return { cmH2O: null, inputs: [] };
  return { cmH2O: peak - peep, inputs: [{ name: "peakCmH2O", value: peak, unit: "cmH2O", item }] };
}

function readPressureControl(scene: Scene, item: Item<MechanicsFact>): Reading {
  const base = { t: item.t, item, value: null, inputs: [] };
  const above = pressureAbove(scene, item);
  const peep = settingInput(settingsAt(scene, item.t), "peepCmH2O", "cmH2O");
  const rate = rateAt(scene, item);
  const { volumeMl, inputs: volumes } = volumeAt(scene, item);
  const peepCmH2O = peep[0]?.value ?? null;
  if (above.cmH2O === null || peepCmH2O === null || rate.perMin === null || volumeMl === null) return base;
  const arguments_ = { tidalVolumeMl: volumeMl, respiratoryRate: rate.perMin, peepCmH2O };
  const value = computable(() =>
    mechanicalPowerPressureControlJPerMin({ ...arguments_, pressureAbovePeepCmH2O: above.cmH2O! }),
  );
  const notes: NoteCode[] = value === null ? [...rate.notes, "not-computable"] : rate.notes;
  return { ...base, value, notes, inputs: [...volumes, ...rate.inputs, ...above.inputs, ...peep] };
}

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
