import { fieldsOfMode, type SettingField, type VentilationMode } from "../../physiology/modes";
import type { SettingsFact } from "../facts";
import { asksPlateau } from "../modes-asked";
import type { Item } from "./item";

export interface Held {
  value: number | string;
  item: Item<SettingsFact>;
}

/** Settings in force from `t` on. */
export interface Snapshot {
  t: number;
  item: Item<SettingsFact>;
  mode: VentilationMode;
  modeItem: Item<SettingsFact>;
  values: Partial<Record<SettingField, Held>>;
  /** Start of this unbroken run of the mode. */
  modeBegan: number;
  /** Start of the unbroken run of modes that ask a plateau; null in one that does not. */
  askBegan: number | null;
}

const fieldsByMode = new Map<VentilationMode, readonly SettingField[]>();

/** The mode's fields as a list that is made once. */
export function fieldsOf(mode: VentilationMode): readonly SettingField[] {
  const known = fieldsByMode.get(mode);
  if (known) return known;
  const fields = [...fieldsOfMode(mode)];
  fieldsByMode.set(mode, fields);
  return fields;
}

function hold(values: Snapshot["values"], mode: VentilationMode, item: Item<SettingsFact>): Snapshot["values"] {
  for (const field of fieldsOf(mode)) {
    const value = item.fact[field];
    if (value !== null && value !== undefined) values[field] = { value, item };
  }
  return values;
}

function begin(item: Item<SettingsFact>, mode: VentilationMode, previous: Snapshot | null): Snapshot {
  const asks = asksPlateau(mode);
  return {
    t: item.t,
    item,
    mode,
    modeItem: item,
    values: hold({}, mode, item),
    modeBegan: previous?.mode === mode ? previous.modeBegan : item.t,
    askBegan: asks ? (previous?.askBegan ?? item.t) : null,
  };
}

function add(last: Snapshot, item: Item<SettingsFact>): Snapshot {
  return { ...last, t: item.t, item, values: hold({ ...last.values }, last.mode, item) };
}

/**
 * V1: settings in force after each entry: a standing entry that carries `mode` begins anew, the others add to it.
 * Fields that the mode does not use are ignored; before the first mode nothing is in force.
 */
export function foldSettings(items: readonly Item<SettingsFact>[]): Snapshot[] {
  const snapshots: Snapshot[] = [];
  let last: Snapshot | null = null;
  for (const item of items) {
    if (item.fact.mode) last = begin(item, item.fact.mode, last);
    else if (last) last = add(last, item);
    if (last) snapshots.push(last);
  }
  return snapshots;
}

/** A numeric setting in force, or null. */
export function numberInForce(snapshot: Snapshot | null, field: SettingField): number | null {
  const value = snapshot?.values[field]?.value;
  return typeof value === "number" ? value : null;
}
