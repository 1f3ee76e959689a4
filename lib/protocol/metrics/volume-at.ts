import type { MechanicsFact } from "../facts";
import type { Input } from "../judge/reading";
import { settingsAt, type Scene } from "../scene";
import type { Item } from "../timeline/item";
import { settingInput } from "./setting-input";

/** V5: the volume at a reading: exhaled of the same reading, else the set one then in force. */
export function volumeAt(scene: Scene, item: Item<MechanicsFact>): { volumeMl: number | null; inputs: Input[] } {
  const exhaled = item.fact.exhaledTidalVolumeMl ?? null;
  if (exhaled !== null) {
    return { volumeMl: exhaled, inputs: [{ name: "exhaledTidalVolumeMl", value: exhaled, unit: "mL", item }] };
  }
  const inputs = settingInput(settingsAt(scene, item.t), "tidalVolumeMl", "mL");
  return { volumeMl: inputs[0]?.value ?? null, inputs };
}
