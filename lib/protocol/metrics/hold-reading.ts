import type { MechanicsFact } from "../facts";
import { totalPeepOf } from "../judge/total-peep-of";
import type { Input, Reading } from "../judge/reading";
import type { NoteCode } from "../note-codes";
import type { Scene } from "../scene";
import type { Hold } from "../timeline/holds";
import type { Item } from "../timeline/item";
import { metEffort } from "./plateau";
import { settingInput } from "./setting-input";

/** A relaxed hold with the total PEEP that belongs to it (V4). */
export interface PairedHold {
  plateauCmH2O: number;
  totalPeepCmH2O: number;
  item: Item<MechanicsFact>;
  notes: NoteCode[];
  inputs: Input[];
}

/** V9: at zero flow the plateau is set PEEP + pressure above PEEP; set PEEP is named once. */
function plateauInputs(hold: Hold, isSetPeep: boolean): Input[] {
  if (!hold.zeroFlow) return [{ name: "plateauCmH2O", value: hold.plateauCmH2O, unit: "cmH2O", item: hold.item }];
  const above = settingInput(hold.snapshot, "pressureAbovePeepCmH2O", "cmH2O");
  return isSetPeep ? above : [...above, ...settingInput(hold.snapshot, "peepCmH2O", "cmH2O")];
}

/**
 * V4, V8: a number worked out from a hold: null from one with effort, and where total PEEP is missing. `compute`
 * answers null for what cannot be computed (V14), and adds what else went into it.
 */
export function readHold(
  scene: Scene,
  hold: Hold,
  compute: (paired: PairedHold) => Pick<Reading, "value" | "inputs"> & { notes?: NoteCode[] },
): Reading {
  const { t, item } = hold;
  const base = { t, item, value: null, inputs: [] };
  if (metEffort(hold)) return { ...base, effort: true, notes: ["patient-effort"] };
  if (hold.quality === "p-high" || hold.plateauCmH2O === null) return base;
  const mechanics = item as Item<MechanicsFact>;
  const peep = totalPeepOf(scene, mechanics);
  const notes: NoteCode[] = [...(hold.zeroFlow ? (["zero-flow"] as const) : []), ...peep.notes];
  if (peep.value === null) return { ...base, notes };
  const isSetPeep = peep.inputs.some(({ name }) => name === "peepCmH2O");
  const inputs = [...plateauInputs(hold, isSetPeep), ...peep.inputs];
  const paired = { plateauCmH2O: hold.plateauCmH2O, totalPeepCmH2O: peep.value, item: mechanics, notes, inputs };
  const computed = compute(paired);
  const why: NoteCode[] = computed.value === null ? ["not-computable"] : [];
  return {
    ...base,
    ...computed,
    inputs: [...inputs, ...computed.inputs],
    notes: [...notes, ...(computed.notes ?? []), ...why],
  };
}
