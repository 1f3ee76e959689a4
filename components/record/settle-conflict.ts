import type { FieldConflict } from "@/lib/contracts";
import { fieldsOfMode, type SettingField, type VentilationMode } from "@/lib/physiology";
import { shownMode } from "./drafted-settings";
import type { Filled } from "./filled";
import type { RecordValues } from "./record-values";

export type Choice = "mine" | "theirs";

/** Fields that this entry charts itself: there mine and theirs exclude one another. The others only lie under a reading. */
export function isCharted({ yours }: FieldConflict): boolean {
  return yours !== null;
}

function withoutFields(settings: Record<string, string>, drop: (field: string) => boolean): Record<string, string> {
  return Object.fromEntries(Object.entries(settings).filter(([field]) => !drop(field)));
}

/**
 * The form after both values of each field were seen: it starts from what now stands, and charts mine only where mine
 * was chosen. Where theirs is another mode, settings that it does not use are let go.
 */
export function settleConflict(input: {
  values: RecordValues;
  filled: Filled;
  conflict: readonly FieldConflict[];
  choices: Partial<Record<string, Choice>>;
}): { values: RecordValues; filled: Filled } {
  const { values, filled, conflict, choices } = input;
  const inForce = Object.fromEntries(conflict.map(({ field, inForce: now }) => [field, now?.value ?? null]));
  const settled: Filled = { ...filled, values: { ...filled.values, ...inForce } };
  const theirs = new Set(conflict.filter(({ field }) => choices[field] === "theirs").map(({ field }) => field));
  const myMode = shownMode(values, filled);
  const modeMoved = conflict.some(({ field }) => field === "mode");
  const mode = modeMoved ? (theirs.has("mode") || choices["mode"] === undefined ? null : myMode) : values.mode;
  const stands = mode ?? (settled.values["mode"] as VentilationMode | null);
  const used = stands ? fieldsOfMode(stands) : null;
  const drop = (field: string) => theirs.has(field) || (used !== null && !used.has(field as SettingField));
  return {
    filled: settled,
    values: {
      ...values,
      mode,
      settings: withoutFields(values.settings, drop),
      flowPattern: theirs.has("flowPattern") ? null : values.flowPattern,
      triggerType: theirs.has("triggerType") ? null : values.triggerType,
    },
  };
}
