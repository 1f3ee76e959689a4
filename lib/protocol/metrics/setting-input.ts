import type { SettingField } from "../../physiology/modes";
import type { Input } from "../judge/reading";
import type { Snapshot } from "../timeline/fold-settings";

/** A setting in force as an input of a number. */
export function settingInput(snapshot: Snapshot | null, name: SettingField, unit: string): Input[] {
  const held = snapshot?.values[name];
  return held ? [{ name, value: Number(held.value), unit, item: held.item }] : [];
}
