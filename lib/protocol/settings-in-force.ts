import type { SettingField, VentilationMode } from "../physiology/modes";
import type { Author, Instant, SettingsFact } from "./facts";
import { millisecondsOf } from "./instant";
import { foldSettings, type Snapshot } from "./timeline/fold-settings";
import { itemsInOrder, newestUntil, writtenTimes, type Item } from "./timeline/item";

/** A charted value with where it came from. Times are ISO 8601 in UTC. */
export interface ValueInForce<Value> {
  value: Value;
  entryId: string;
  chartedAt: string;
  recordedAt: string;
  author: Author;
}

export type SettingsInForce = { mode: ValueInForce<VentilationMode> | null } & Partial<
  Record<SettingField, ValueInForce<number | string>>
>;

const folded = new WeakMap<readonly SettingsFact[], Snapshot[]>();

function snapshotsOf(changes: readonly SettingsFact[]): Snapshot[] {
  const snapshots = folded.get(changes) ?? foldSettings(itemsInOrder(changes));
  folded.set(changes, snapshots);
  return snapshots;
}

function valueOf<Value>(value: Value, item: Item<SettingsFact>): ValueInForce<Value> {
  return { value, entryId: item.fact.id, ...writtenTimes(item), author: item.fact.author };
}

/**
 * V1: the settings in force at a moment, per field the newest charted value since the newest entry that carries a mode.
 * With no such entry `mode` is null and nothing else is in force.
 */
export function settingsInForce(input: {
  changes: readonly SettingsFact[] | null | undefined;
  at: Instant;
}): SettingsInForce {
  const snapshot = input.changes ? newestUntil(snapshotsOf(input.changes), millisecondsOf(input.at)) : null;
  if (!snapshot) return { mode: null };
  const fields = Object.entries(snapshot.values).map(([field, held]) => [field, valueOf(held.value, held.item)]);
  return { mode: valueOf(snapshot.mode, snapshot.modeItem), ...Object.fromEntries(fields) };
}
