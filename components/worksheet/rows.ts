import { modeSettings, type NumericSettingField, type VentilationMode } from "@/lib/physiology/modes";
import type { DerivedName } from "@/lib/protocol/result";

/** How a number is written: label, unit after it, digits after the point. */
interface NumberStyle {
  label: string;
  unit: string;
  decimals: number;
}

export interface SettingRow extends NumberStyle {
  field: NumericSettingField;
}

export interface MeasuredRow extends NumberStyle {
  field: string;
  source: "mechanics" | "observations" | "bloodGas";
  /** The judged number this reading is, where one is. */
  derived?: DerivedName;
}

export interface DerivedRow extends NumberStyle {
  name: DerivedName;
  /** What to measure when it cannot be worked out: 'plateau'. */
  needs: string;
}

const settingStyles: Record<NumericSettingField, NumberStyle> = {
  tidalVolumeMl: { label: "Tidal volume (VT)", unit: "mL", decimals: 0 },
  pressureAbovePeepCmH2O: { label: "Pressure above PEEP", unit: "cmH2O", decimals: 0 },
  pressureSupportCmH2O: { label: "Pressure support", unit: "cmH2O", decimals: 0 },
  respiratoryRate: { label: "Rate (RR)", unit: "/min", decimals: 0 },
  peepCmH2O: { label: "PEEP", unit: "cmH2O", decimals: 0 },
  inspiratoryTimeS: { label: "Inspiratory time", unit: "s", decimals: 2 },
  flowLPerMin: { label: "Flow", unit: "L/min", decimals: 0 },
  triggerLPerMin: { label: "Trigger, flow", unit: "L/min", decimals: 0 },
  triggerCmH2O: { label: "Trigger, pressure", unit: "cmH2O", decimals: 0 },
  fio2: { label: "FiO2", unit: "", decimals: 2 },
  pHighCmH2O: { label: "P-high", unit: "cmH2O", decimals: 0 },
  pLowCmH2O: { label: "P-low", unit: "cmH2O", decimals: 0 },
  tHighS: { label: "T-high", unit: "s", decimals: 1 },
  tLowS: { label: "T-low", unit: "s", decimals: 2 },
  meanAirwayPressureCmH2O: { label: "Mean airway pressure", unit: "cmH2O", decimals: 0 },
  frequencyHz: { label: "Frequency", unit: "Hz", decimals: 1 },
  amplitudeCmH2O: { label: "Amplitude", unit: "cmH2O", decimals: 0 },
};

/** Reading order of the Set column: what moves the lung first, oxygen last. */
const settingOrder = Object.keys(settingStyles) as NumericSettingField[];

/** The settings a mode shows: what it must have, and what else was charted for it. */
export function settingRows(
  mode: VentilationMode | null,
  charted: (field: NumericSettingField) => boolean,
): SettingRow[] {
  const required: readonly string[] = mode ? modeSettings(mode).required : [];
  return settingOrder
    .filter((field) => required.includes(field) || charted(field))
    .map((field) => ({ field, ...settingStyles[field] }));
}

export const mechanicsRows: MeasuredRow[] = [
  { field: "exhaledTidalVolumeMl", source: "mechanics", label: "Exhaled volume", unit: "mL", decimals: 0 },
  {
    field: "respiratoryRateTotal",
    source: "mechanics",
    derived: "respiratoryRateTotal",
    label: "Total rate",
    unit: "/min",
    decimals: 0,
  },
  { field: "totalPeepCmH2O", source: "mechanics", label: "Total PEEP", unit: "cmH2O", decimals: 0 },
  { field: "plateauCmH2O", source: "mechanics", derived: "plateauCmH2O", label: "Plateau", unit: "cmH2O", decimals: 0 },
  { field: "peakCmH2O", source: "mechanics", label: "Peak", unit: "cmH2O", decimals: 0 },
  { field: "meanAirwayPressureCmH2O", source: "mechanics", label: "Mean airway pressure", unit: "cmH2O", decimals: 0 },
  { field: "spo2Percent", source: "observations", derived: "spo2Percent", label: "SpO2", unit: "%", decimals: 0 },
];

export const gasRows: MeasuredRow[] = [
  { field: "pao2MmHg", source: "bloodGas", derived: "pao2MmHg", label: "PaO2", unit: "mmHg", decimals: 0 },
  { field: "paco2MmHg", source: "bloodGas", derived: "paco2MmHg", label: "PaCO2", unit: "mmHg", decimals: 0 },
  { field: "ph", source: "bloodGas", derived: "ph", label: "pH", unit: "", decimals: 2 },
];

export const otherObservationRows: MeasuredRow[] = [
  { field: "etco2MmHg", source: "observations", label: "EtCO2", unit: "mmHg", decimals: 0 },
  { field: "heartRate", source: "observations", label: "Heart rate", unit: "/min", decimals: 0 },
  { field: "systolicMmHg", source: "observations", label: "Systolic pressure", unit: "mmHg", decimals: 0 },
  { field: "mapMmHg", source: "observations", label: "MAP", unit: "mmHg", decimals: 0 },
];

export const derivedRows: DerivedRow[] = [
  { name: "vtMlPerKg", label: "Volume per kg", unit: "mL/kg", decimals: 1, needs: "height" },
  { name: "minuteVolumeLPerMin", label: "Minute volume", unit: "L/min", decimals: 1, needs: "volume and rate" },
  { name: "intrinsicPeepCmH2O", label: "Trapped (auto-PEEP)", unit: "cmH2O", decimals: 0, needs: "total PEEP" },
  { name: "drivingPressureCmH2O", label: "Driving pressure", unit: "cmH2O", decimals: 0, needs: "plateau" },
  {
    name: "staticComplianceMlPerCmH2O",
    label: "Static compliance",
    unit: "mL/cmH2O",
    decimals: 0,
    needs: "plateau",
  },
  {
    name: "mechanicalPowerJPerMin",
    label: "Mechanical power",
    unit: "J/min",
    decimals: 0,
    needs: "plateau and peak",
  },
  { name: "sfRatio", label: "S/F", unit: "", decimals: 0, needs: "SpO2" },
];

export const gasDerivedRows: DerivedRow[] = [
  { name: "pfRatio", label: "P/F", unit: "", decimals: 0, needs: "gas" },
  { name: "ventilatoryRatio", label: "Ventilatory ratio", unit: "", decimals: 1, needs: "gas and minute volume" },
  { name: "oxygenationIndex", label: "Oxygenation index", unit: "", decimals: 1, needs: "gas and mean pressure" },
];

export const lastDerivedRows: DerivedRow[] = [
  {
    name: "dynamicComplianceMlPerCmH2O",
    label: "Dynamic compliance",
    unit: "mL/cmH2O",
    decimals: 0,
    needs: "peak",
  },
  {
    name: "airwayResistanceCmH2OPerLPerS",
    label: "Resistance",
    unit: "cmH2O/(L/s)",
    decimals: 0,
    needs: "peak, plateau and flow",
  },
];
