import type { ChartedField } from "@/lib/physiology";
import { modeSettings, type NumericSettingField, type VentilationMode } from "@/lib/physiology";

/** How a field of the form is named, stepped and written. */
export interface FieldStyle {
  label: string;
  /** After the label: unit, and what else stands there always. */
  unit: string;
  /** Spoken and written after the number in sentences. */
  short: string;
  step: number;
  decimals: number;
}

const style = (label: string, unit: string, step: number, decimals = 0, short = label): FieldStyle => ({
  label,
  unit,
  short,
  step,
  decimals,
});

export const settingStyles: Record<NumericSettingField, FieldStyle> = {
  peepCmH2O: style("PEEP", "cmH2O", 1),
  tidalVolumeMl: style("Tidal volume", "VT, mL", 10, 0, "VT"),
  pressureAbovePeepCmH2O: style("Pressure above PEEP", "cmH2O", 1, 0, "pressure"),
  pressureSupportCmH2O: style("Pressure support", "above PEEP, cmH2O", 1, 0, "support"),
  respiratoryRate: style("Rate", "/min", 1, 0, "rate"),
  fio2: style("FiO2", "%", 0.05, 2),
  inspiratoryTimeS: style("Inspiratory time", "seconds", 0.05, 2),
  flowLPerMin: style("Flow", "L/min", 5, 0, "flow"),
  triggerLPerMin: style("Flow trigger", "L/min", 0.5, 1, "trigger"),
  triggerCmH2O: style("Pressure trigger", "cmH2O below PEEP", 0.5, 1, "trigger"),
  pHighCmH2O: style("P-high", "cmH2O", 1),
  pLowCmH2O: style("P-low", "cmH2O", 1),
  tHighS: style("T-high", "seconds", 0.1, 1),
  tLowS: style("T-low", "seconds", 0.05, 2),
  meanAirwayPressureCmH2O: style("Mean airway pressure", "cmH2O", 1, 0, "mean pressure"),
  frequencyHz: style("Frequency", "Hz", 0.5, 1, "frequency"),
  amplitudeCmH2O: style("Amplitude", "cmH2O", 2, 0, "amplitude"),
};

/** Form order: pressure that stays, volume or pressure that comes, rate, oxygen, time, flow. */
const settingOrder = Object.keys(settingStyles) as NumericSettingField[];

const triggers: readonly NumericSettingField[] = ["triggerLPerMin", "triggerCmH2O"];

/** The rows of steppers a mode shows. Trigger and pattern stand behind 'Pattern, trigger, I:E'. */
export function settingRowsOf(mode: VentilationMode): NumericSettingField[] {
  const { required, oneOf, optional } = modeSettings(mode);
  const used = new Set<string>([...required, ...oneOf, ...optional]);
  return settingOrder.filter((field) => used.has(field) && !triggers.includes(field));
}

export type MechanicsNumber =
  | "plateauCmH2O"
  | "totalPeepCmH2O"
  | "peakCmH2O"
  | "exhaledTidalVolumeMl"
  | "spontaneousTidalVolumeMl"
  | "respiratoryRateTotal"
  | "minuteVolumeLPerMin"
  | "meanAirwayPressureCmH2O"
  | "pesEndInspiratoryCmH2O"
  | "pesEndExpiratoryCmH2O";

export type ObservationNumber =
  "spo2Percent" | "etco2MmHg" | "respiratoryRateTotal" | "heartRate" | "systolicMmHg" | "mapMmHg";

export const mechanicsStyles: Record<MechanicsNumber, FieldStyle> = {
  plateauCmH2O: style("Plateau", "", 1),
  totalPeepCmH2O: style("Total PEEP", "", 1),
  peakCmH2O: style("Peak", "", 1),
  exhaledTidalVolumeMl: style("Exhaled volume", "mL", 10),
  spontaneousTidalVolumeMl: style("Spontaneous volume", "mL", 10),
  respiratoryRateTotal: style("Total rate", "/min", 1),
  minuteVolumeLPerMin: style("Minute volume", "L/min", 0.5, 1),
  meanAirwayPressureCmH2O: style("Mean airway pressure", "cmH2O", 1),
  pesEndInspiratoryCmH2O: style("Oesophageal, end of inspiration", "cmH2O", 1),
  pesEndExpiratoryCmH2O: style("Oesophageal, end of expiration", "cmH2O", 1),
};

export const observationStyles: Record<ObservationNumber, FieldStyle> = {
  spo2Percent: style("SpO2", "%", 1),
  etco2MmHg: style("EtCO2", "mmHg", 1),
  respiratoryRateTotal: style("Total rate", "/min", 1),
  heartRate: style("Heart rate", "/min", 1),
  systolicMmHg: style("Systolic pressure", "mmHg", 5),
  mapMmHg: style("MAP", "mmHg", 1),
};

const withoutInvasiveTube: readonly VentilationMode[] = ["NIV", "HFNO"];
const holdsNothing: readonly VentilationMode[] = [...withoutInvasiveTube, "HFOV"];

/** Measurements that stand open in a mode; the others come with 'Add a measurement'. */
export function openMechanicsOf(mode: VentilationMode): MechanicsNumber[] {
  if (mode === "HFNO" || mode === "HFOV") return [];
  const pressures: MechanicsNumber[] = holdsNothing.includes(mode) ? [] : ["plateauCmH2O", "totalPeepCmH2O"];
  const volumes: MechanicsNumber[] = mode.startsWith("SIMV")
    ? ["exhaledTidalVolumeMl", "spontaneousTidalVolumeMl"]
    : ["exhaledTidalVolumeMl"];
  return [...pressures, "peakCmH2O", ...volumes, "respiratoryRateTotal"];
}

export function addedMechanicsOf(mode: VentilationMode): MechanicsNumber[] {
  if (mode === "HFNO" || mode === "HFOV") return [];
  return ["minuteVolumeLPerMin", "meanAirwayPressureCmH2O", "pesEndInspiratoryCmH2O", "pesEndExpiratoryCmH2O"];
}

export const observationOrder: ObservationNumber[] = [
  "spo2Percent",
  "etco2MmHg",
  "respiratoryRateTotal",
  "heartRate",
  "systolicMmHg",
  "mapMmHg",
];

/** Flow of a high-flow cannula has limits of its own. */
export function limitsFieldOf(field: string, mode: VentilationMode | null): ChartedField {
  if (field === "flowLPerMin" && mode === "HFNO") return "hfnoFlowLPerMin";
  return field as ChartedField;
}
