import {
  AppError,
  chartedSettings,
  type BasedOn,
  type FieldConflict,
  type Issue,
  type SettingsValue,
  type SettingsValues,
  type Value,
} from "@/lib/contracts";
import { compareToLimit } from "@/lib/protocol";

/** Settings in force at a moment, each with the entry it came from; a field that is not set is left out. */
export type SettingsInForce = Partial<Record<keyof SettingsValues, Value>>;

/** Measured pressures mean nothing without these, so a bedside entry that measures says on which it measured. */
const settingsUnderMechanics = [
  "tidalVolumeMl",
  "pressureAbovePeepCmH2O",
  "pressureSupportCmH2O",
  "peepCmH2O",
  "mode",
] as const;

export function touchedFields(settings: SettingsValues | undefined, withMechanics: boolean): (keyof SettingsValues)[] {
  const charted = settings ? chartedSettings(settings) : [];
  return [...new Set([...charted, ...(withMechanics ? settingsUnderMechanics : [])])];
}

function sameValue(one: SettingsValue | null, other: SettingsValue | null): boolean {
  if (typeof one === "number" && typeof other === "number") return compareToLimit(one, other) === 0;
  return one === other;
}

/** A touched field that the entry does not say it started from. `null` says that none of them was in force. */
export function missingBasedOn(fields: readonly string[], basedOn: BasedOn): Issue[] {
  return fields
    .filter((field) => basedOn !== null && basedOn[field] === undefined)
    .map((field) => ({
      path: `basedOn.${field}`,
      message: "Say which value in force the form showed, null for none.",
    }));
}

/** Refuses an entry whose touched settings are no longer what its form showed: both are handed back, neither is lost. */
export function compareBasedOn(
  fields: readonly (keyof SettingsValues)[],
  { basedOn, inForce, yours = {} }: { basedOn: BasedOn; inForce: SettingsInForce; yours?: SettingsValues | undefined },
): void {
  const conflict = fields.flatMap((field): FieldConflict[] => {
    const [shown, now] = [basedOn?.[field] ?? null, inForce[field]];
    if (sameValue(shown, settingsValue(now))) return [];
    return [{ field, yours: yours[field] ?? null, basedOn: shown, inForce: now ? standing(now) : null }];
  });
  if (conflict.length > 0)
    throw new AppError("conflict", "Settings were charted meanwhile: look at both and choose.", { conflict });
}

function settingsValue(value: Value | undefined): SettingsValue | null {
  return value === undefined || typeof value.value === "boolean" ? null : value.value;
}

function standing(value: Value): NonNullable<FieldConflict["inForce"]> {
  const { entryId, chartedAt, author } = value;
  return { value: settingsValue(value), entryId, chartedAt, author };
}
