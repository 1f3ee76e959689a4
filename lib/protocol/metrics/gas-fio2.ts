import type { BloodGasFact } from "../facts";
import type { Input } from "../judge/reading";
import { settingsAt, type Scene } from "../scene";
import type { Item } from "../timeline/item";
import { settingInput } from "./setting-input";

/** V5: a gas's FiO2 or PEEP: as typed with it, else as set when it was drawn. */
export function atGas(scene: Scene, gas: Item<BloodGasFact>, name: "fio2" | "peepCmH2O"): Input | null {
  const unit = name === "fio2" ? "fraction" : "cmH2O";
  const typed = gas.fact[name] ?? null;
  if (typed !== null) return { name, value: typed, unit, item: gas };
  return settingInput(settingsAt(scene, gas.t), name, unit)[0] ?? null;
}

/** S1: FiO2 of a gas as integer percent. */
export function gasFio2Percent(scene: Scene, gas: Item<BloodGasFact>): number | null {
  const fio2 = atGas(scene, gas, "fio2")?.value ?? null;
  return fio2 === null ? null : Math.round(fio2 * 100);
}
