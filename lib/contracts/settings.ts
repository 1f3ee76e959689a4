import { z } from "zod";
import { fieldsOfMode, modeLabel, modeSettings, settingFields, ventilationModes } from "../physiology/modes";
import { charted, fio2Schema, refusalOf } from "./fields";
import { wordsOf } from "./field-words";

export const modeSchema = z.enum(ventilationModes, { error: "Not a mode that can be charted here." });

/** The charted settings of an entry: only what was changed. `mode` makes the entry complete for that mode. */
export const settingsValuesSchema = z.strictObject({
  mode: modeSchema.optional(),
  tidalVolumeMl: charted("tidalVolumeMl").optional(),
  pressureAbovePeepCmH2O: charted("pressureAbovePeepCmH2O").optional(),
  pressureSupportCmH2O: charted("pressureSupportCmH2O").optional(),
  respiratoryRate: charted("respiratoryRate").optional(),
  peepCmH2O: charted("peepCmH2O").optional(),
  fio2: fio2Schema.optional(),
  inspiratoryTimeS: charted("inspiratoryTimeS").optional(),
  // The union of flow in conventional ventilation and in high flow; the mode decides which one holds.
  flowLPerMin: z
    .number()
    .min(1, "Flow is 5 to 200 L/min; in high flow 1 to 80.")
    .max(200, "Flow is 5 to 200 L/min; in high flow 1 to 80.")
    .optional(),
  flowPattern: z.enum(["square", "decelerating"]).optional(),
  triggerType: z.enum(["flow", "pressure"]).optional(),
  triggerLPerMin: charted("triggerLPerMin").optional(),
  triggerCmH2O: charted("triggerCmH2O").optional(),
  pHighCmH2O: charted("pHighCmH2O").optional(),
  pLowCmH2O: charted("pLowCmH2O").optional(),
  tHighS: charted("tHighS").optional(),
  tLowS: charted("tLowS").optional(),
  meanAirwayPressureCmH2O: charted("meanAirwayPressureCmH2O").optional(),
  frequencyHz: charted("frequencyHz").optional(),
  amplitudeCmH2O: charted("amplitudeCmH2O").optional(),
});

export type SettingsValues = z.infer<typeof settingsValuesSchema>;

export type SettingsValue = number | string;

/** The fields a settings body charts, in form order. */
export function chartedSettings(values: SettingsValues): (keyof SettingsValues)[] {
  return (["mode", ...settingFields] as const).filter((field) => values[field] !== undefined);
}

/**
 * What stands against charting these settings in a mode: fields it does not use, flow outside that mode's range and,
 * where `complete` is asked, what is missing. Empty when they may be charted.
 */
export function settingsIssues(
  values: SettingsValues,
  mode: NonNullable<SettingsValues["mode"]>,
  complete: boolean,
): { path: string; message: string }[] {
  const label = modeLabel(mode);
  const used = fieldsOfMode(mode);
  const issues = chartedSettings(values)
    .filter((field) => field !== "mode" && !used.has(field))
    .map((field) => ({ path: field, message: `${label} does not use this setting.` }));
  if (values.flowLPerMin !== undefined && used.has("flowLPerMin")) {
    const refusal = refusalOf(mode === "HFNO" ? "hfnoFlowLPerMin" : "flowLPerMin", values.flowLPerMin);
    if (refusal) issues.push({ path: "flowLPerMin", message: refusal });
  }
  if (!complete) return issues;
  const { required, oneOf } = modeSettings(mode);
  for (const field of required.filter((name) => values[name] === undefined)) {
    issues.push({ path: field, message: `${label} needs ${wordsOf(field)}.` });
  }
  if (oneOf.length > 0 && oneOf.every((name) => values[name] === undefined)) {
    issues.push({
      path: oneOf[0] ?? "mode",
      message: `${label} needs ${oneOf.map((name) => wordsOf(name)).join(" or ")}.`,
    });
  }
  return issues;
}
