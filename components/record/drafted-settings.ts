import { sameNumber } from "./same-number";
import { filledMode, filledNumber, filledWord, type Filled } from "./filled";
import { limitsFieldOf } from "./form-fields";
import type { RecordValues } from "./record-values";
import { chartable } from "./typed-number";
import { fieldsOfMode, numericSettingFields, type NumericSettingField } from "@/lib/physiology";
import type { SettingsValues } from "@/lib/contracts";

/** The mode as the form now shows it. */
export function shownMode(values: RecordValues, filled: Filled) {
  return values.mode ?? filledMode(filled);
}

/** The number as the form now shows it, typed or filled; null where neither stands or the typed one is refused. */
export function shownNumber(values: RecordValues, filled: Filled, field: NumericSettingField): number | null {
  const text = values.settings[field];
  if (text === undefined || text.trim() === "") return filledNumber(filled, field);
  return chartable(limitsFieldOf(field, shownMode(values, filled)), text);
}

/** Whether what stands in the field differs from what the form was filled with. */
export function isChanged(values: RecordValues, filled: Filled, field: NumericSettingField): boolean {
  const shown = shownNumber(values, filled, field);
  if (shown === null) return false;
  const was = filledNumber(filled, field);
  return was === null || !sameNumber(shown, was);
}

/**
 * The settings this entry charts: only what differs, or, where the mode changes or none is in force, everything the
 * mode uses, so that the entry is complete.
 */
export function draftedSettings(values: RecordValues, filled: Filled): SettingsValues {
  const mode = shownMode(values, filled);
  if (!mode) return {};
  const complete = mode !== filledMode(filled);
  const used = fieldsOfMode(mode);
  const drafted: SettingsValues = complete ? { mode } : {};
  for (const field of numericSettingFields) {
    const shown = used.has(field) ? shownNumber(values, filled, field) : null;
    if (shown !== null && (complete || isChanged(values, filled, field))) drafted[field] = shown;
  }
  for (const field of ["flowPattern", "triggerType"] as const) {
    const word = values[field] ?? (complete ? filledWord(filled, field) : null);
    if (word && used.has(field) && (complete || word !== filledWord(filled, field))) {
      Object.assign(drafted, { [field]: word });
    }
  }
  return drafted;
}
