import type { SettingField } from "../../physiology/modes";
import { compareToLimit } from "../compare-to-limit";
import { changeKind as k, type Change } from "./change-kinds";
import { fieldsOf, type Held, type Snapshot } from "./fold-settings";

/** F3: a set rate or volume lowered by this share or more makes a gas due. Starting value, from memory. */
const cutShare = 0.2;

/** Values charted later for the first time that count as a change (V2): they were running unknown before. */
const unknownBefore: ReadonlySet<SettingField> = new Set(["inspiratoryTimeS", "flowLPerMin"]);

const up = (direction: number, kind: number) => (direction >= 0 ? kind : 0);
const down = (direction: number, kind: number) => (direction <= 0 ? kind : 0);

/** F6: what a differing value counts as. `direction` is its sign, 0 where the value before is not known. */
function kindsOf(field: SettingField, direction: number, snapshot: Snapshot): number {
  switch (field) {
    case "tidalVolumeMl":
      return k.volume;
    case "pressureAbovePeepCmH2O":
    case "pressureSupportCmH2O":
    case "amplitudeCmH2O":
      return k.pressure;
    case "respiratoryRate":
    case "frequencyHz":
      return k.rate | up(direction, k.shorterExpiration);
    case "inspiratoryTimeS":
      return k.inspiratoryTime | up(direction, k.shorterExpiration);
    case "tHighS":
      return k.rate | k.inspiratoryTime | up(direction, k.shorterExpiration);
    case "tLowS":
      return k.rate | k.inspiratoryTime | down(direction, k.shorterExpiration);
    case "flowLPerMin":
      return snapshot.mode === "HFNO" ? k.peep : k.flow | down(direction, k.shorterExpiration);
    case "peepCmH2O":
    case "meanAirwayPressureCmH2O":
      return k.peep;
    case "pHighCmH2O":
    case "pLowCmH2O":
      return k.peep | k.pressure;
    case "fio2":
      return k.fio2;
    case "flowPattern":
      return k.flowPattern;
    default:
      return 0;
  }
}

function isCut(field: SettingField, before: number, after: number): boolean {
  if (field !== "respiratoryRate" && field !== "tidalVolumeMl") return false;
  return compareToLimit(before - after, cutShare * before) >= 0;
}

function kindsOfValue(field: SettingField, before: Held | undefined, after: Held, snapshot: Snapshot): number {
  if (!before) return unknownBefore.has(field) ? kindsOf(field, 0, snapshot) : 0;
  if (typeof before.value === "string" || typeof after.value === "string") {
    return before.value === after.value ? 0 : kindsOf(field, 0, snapshot);
  }
  const direction = compareToLimit(after.value, before.value);
  if (direction === 0) return 0;
  return kindsOf(field, direction, snapshot) | (isCut(field, before.value, after.value) ? k.ventilationCut : 0);
}

function kindsBetween(before: Snapshot, after: Snapshot): number {
  const modeChanged = before.mode !== after.mode;
  let kinds = modeChanged ? k.mode : 0;
  for (const field of fieldsOf(after.mode)) {
    const held = after.values[field];
    const earlier = before.values[field];
    if (!held || held.item !== after.item || (modeChanged && !earlier)) continue;
    kinds |= kindsOfValue(field, earlier, held, after);
  }
  return kinds;
}

/** V2: changes of settings: values that differ from those then in force. The first settings are none. */
export function settingChanges(snapshots: readonly Snapshot[]): Change[] {
  const changes: Change[] = [];
  for (let index = 1; index < snapshots.length; index++) {
    const after = snapshots[index]!;
    const kinds = kindsBetween(snapshots[index - 1]!, after);
    if (kinds !== 0) changes.push({ t: after.t, kinds, entryId: after.item.fact.id, by: "settings" });
  }
  return changes;
}
