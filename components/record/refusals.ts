import { mechanicsIssues, plateauOverSetPeepIssue, settingsIssues, totalPeepIssue } from "@/lib/contracts";
import { fieldsOfMode, type ChartedField, type NumericSettingField } from "@/lib/physiology";
import { draftedMechanics } from "./drafted-measurements";
import { draftedSettings, shownMode, shownNumber } from "./drafted-settings";
import { filledMode, type Filled } from "./filled";
import { limitsFieldOf } from "./form-fields";
import type { RecordValues } from "./record-values";
import { typedNumber } from "./typed-number";

/** Sentences by field; a measured total rate and an observed one are two fields. */
export type Refusals = Partial<Record<string, string>>;

/** Fields of one part of the form, so that equal names in two parts stay apart. */
export const refusalKey = (part: "settings" | "mechanics" | "observations", field: string) => `${part}.${field}`;

function typedRefusals(part: "settings" | "mechanics" | "observations", values: RecordValues, filled: Filled) {
  const mode = shownMode(values, filled);
  const refusals: Refusals = {};
  for (const [field, text] of Object.entries(values[part])) {
    if (part === "settings" && mode && !fieldsOfMode(mode).has(field as NumericSettingField)) continue;
    const typed = typedNumber(limitsFieldOf(field, mode), text);
    if (typed && "refusal" in typed) refusals[refusalKey(part, field)] = typed.refusal;
  }
  return refusals;
}

/** The set PEEP at the form's time, this entry's own included. */
function setPeepOf(values: RecordValues, filled: Filled): number | null {
  const mode = shownMode(values, filled);
  return mode && fieldsOfMode(mode).has("peepCmH2O") ? shownNumber(values, filled, "peepCmH2O") : null;
}

function readingRefusals(values: RecordValues, filled: Filled): Refusals {
  const reading = draftedMechanics(values) ?? {};
  const setPeep = setPeepOf(values, filled);
  const issues = [
    ...mechanicsIssues(reading).filter(({ path }) => path !== "holdReason"),
    totalPeepIssue(reading.totalPeepCmH2O, setPeep),
    plateauOverSetPeepIssue(reading, setPeep),
  ];
  return Object.fromEntries(
    issues.flatMap((issue) => (issue ? [[refusalKey("mechanics", issue.path), issue.message]] : [])),
  );
}

/** Everything that may not be charted, as a sentence at its field that says why and what is accepted. */
export function refusalsOf(values: RecordValues, filled: Filled): Refusals {
  return {
    ...readingRefusals(values, filled),
    ...typedRefusals("settings", values, filled),
    ...typedRefusals("mechanics", values, filled),
    ...typedRefusals("observations", values, filled),
  };
}

/** What a newly charted mode still needs; empty where the mode stays. */
export function missingSettings(values: RecordValues, filled: Filled): { field: ChartedField; sentence: string }[] {
  const mode = shownMode(values, filled);
  if (!mode || mode === filledMode(filled)) return [];
  return settingsIssues(draftedSettings(values, filled), mode, true).map(({ path, message }) => ({
    field: path as ChartedField,
    sentence: message,
  }));
}
