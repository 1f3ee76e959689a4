/**
 * Ventilation modes and the settings each one uses. Labels follow ISO 19223 (A/C-VC, A/C-PC, A/C-vtPC, SIMV-VC\PS,
 * SIMV-PC\PS, CSV-PS); CPAP, APRV, HFOV, NIV and HFNO are terms of the trade.
 */
export const ventilationModes = [
  "A/C-VC",
  "A/C-PC",
  "A/C-vtPC",
  "SIMV-VC-PS",
  "SIMV-PC-PS",
  "CSV-PS",
  "CPAP",
  "APRV",
  "HFOV",
  "NIV",
  "HFNO",
] as const;

export type VentilationMode = (typeof ventilationModes)[number];

/** The numeric settings, in the order a form shows them. `flowPattern` and `triggerType` are words. */
export const numericSettingFields = [
  "peepCmH2O",
  "tidalVolumeMl",
  "pressureAbovePeepCmH2O",
  "pressureSupportCmH2O",
  "respiratoryRate",
  "fio2",
  "inspiratoryTimeS",
  "flowLPerMin",
  "triggerLPerMin",
  "triggerCmH2O",
  "pHighCmH2O",
  "pLowCmH2O",
  "tHighS",
  "tLowS",
  "meanAirwayPressureCmH2O",
  "frequencyHz",
  "amplitudeCmH2O",
] as const;

export type NumericSettingField = (typeof numericSettingFields)[number];

export const settingFields = [...numericSettingFields, "flowPattern", "triggerType"] as const;

export type SettingField = (typeof settingFields)[number];

interface ModeSettings {
  /** Each must be charted before the settings are complete for the mode. */
  required: readonly NumericSettingField[];
  /** At least one of these completes the mode, where any is named. */
  oneOf: readonly NumericSettingField[];
  optional: readonly SettingField[];
}

const trigger = ["triggerType", "triggerLPerMin", "triggerCmH2O"] as const;
const volumeControl = {
  required: ["tidalVolumeMl", "respiratoryRate", "peepCmH2O", "fio2"],
  oneOf: ["inspiratoryTimeS", "flowLPerMin"],
  optional: ["inspiratoryTimeS", "flowLPerMin", "flowPattern", ...trigger],
} as const satisfies ModeSettings;
const pressureControl = {
  required: ["pressureAbovePeepCmH2O", "respiratoryRate", "peepCmH2O", "fio2", "inspiratoryTimeS"],
  oneOf: [],
  optional: [...trigger],
} as const satisfies ModeSettings;
const support = {
  required: ["pressureSupportCmH2O", "peepCmH2O", "fio2"],
  oneOf: [],
  optional: [...trigger],
} as const satisfies ModeSettings;

const settingsByMode: Record<VentilationMode, ModeSettings> = {
  "A/C-VC": volumeControl,
  "A/C-PC": pressureControl,
  "A/C-vtPC": volumeControl,
  "SIMV-VC-PS": { ...volumeControl, required: [...volumeControl.required, "pressureSupportCmH2O"] },
  "SIMV-PC-PS": { ...pressureControl, required: [...pressureControl.required, "pressureSupportCmH2O"] },
  "CSV-PS": support,
  CPAP: { required: ["peepCmH2O", "fio2"], oneOf: [], optional: [...trigger] },
  APRV: { required: ["pHighCmH2O", "pLowCmH2O", "tHighS", "tLowS", "fio2"], oneOf: [], optional: [] },
  HFOV: { required: ["meanAirwayPressureCmH2O", "frequencyHz", "amplitudeCmH2O", "fio2"], oneOf: [], optional: [] },
  NIV: support,
  HFNO: { required: ["flowLPerMin", "fio2"], oneOf: [], optional: [] },
};

/** What settings of a mode must and may hold. */
export function modeSettings(mode: VentilationMode): ModeSettings {
  return settingsByMode[mode];
}

/** Every field a mode uses; others are ignored in force and refused on entry. */
export function fieldsOfMode(mode: VentilationMode): ReadonlySet<SettingField> {
  const { required, oneOf, optional } = settingsByMode[mode];
  return new Set<SettingField>([...required, ...oneOf, ...optional]);
}

/** How a mode is written for people: `SIMV-VC-PS` reads `SIMV-VC\PS`. */
export function modeLabel(mode: VentilationMode): string {
  return mode.startsWith("SIMV") ? mode.replace(/-PS$/, "\\PS") : mode;
}
