import { mechanicalPowerPressureControlJPerMin } from "../../physiology/mechanical-power-pressure-control-j-per-min";
import { mechanicalPowerVolumeControlJPerMin } from "../../physiology/mechanical-power-volume-control-j-per-min";
import type { MechanicsFact } from "../facts";
import { computable } from "../judge/computable";
import type { Input, Reading } from "../judge/reading";
import type { NoteCode } from "../note-codes";
import { settingsAt, type Scene } from "../scene";
import { numberInForce } from "../timeline/fold-settings";
import type { Hold } from "../timeline/holds";
import type { Item } from "../timeline/item";
import { readHold } from "./hold-reading";
import { settingInput } from "./setting-input";
import { totalRateAt } from "./total-rate";
import { volumeAt } from "./volume-at";

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

/** V10: volume form, from a hold. */
export function readVolumeControl(scene: Scene, hold: Hold): Reading {
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

/** V10: pressure form, from an exhaled volume. */
export function readPressureControl(scene: Scene, item: Item<MechanicsFact>): Reading {
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
