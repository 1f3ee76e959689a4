import { pairedWith } from "../judge/paired-with";
import type { Input } from "../judge/reading";
import { settingsAt, type Scene } from "../scene";
import { countUntil } from "../timeline/item";
import { settingInput } from "./setting-input";

/** V5: mean airway pressure that belongs to a moment: within 1 h and no listed change between; in HFOV the set one. */
export function meanPressureAt(scene: Scene, t: number): Input | null {
  const snapshot = settingsAt(scene, t);
  if (snapshot?.mode === "HFOV") return settingInput(snapshot, "meanAirwayPressureCmH2O", "cmH2O")[0] ?? null;
  const item = pairedWith(scene, scene.line.meanPressures, "breathsAndOxygen", t);
  return item && { name: "meanAirwayPressureCmH2O", value: item.fact.meanAirwayPressureCmH2O!, unit: "cmH2O", item };
}

/** Without any mean airway pressure, measured or set, there is no index to look for. */
export function hasMeanPressure(scene: Scene): boolean {
  const { meanPressures, snapshots } = scene.line;
  return countUntil(meanPressures, scene.at) > 0 || snapshots.some(({ t, mode }) => t <= scene.at && mode === "HFOV");
}
