import type { ChartedField } from "../physiology/limits";

/** How a charted field is named and measured in a sentence: `[words, unit]`. */
const fieldWords: Record<ChartedField, readonly [string, string]> = {
  fio2: ["FiO2", ""],
  tidalVolumeMl: ["Tidal volume", "mL"],
  exhaledTidalVolumeMl: ["Exhaled volume", "mL"],
  spontaneousTidalVolumeMl: ["Spontaneous volume", "mL"],
  tidalVolumeMlPerKg: ["Volume per kg", "mL/kg"],
  respiratoryRate: ["Rate", "/min"],
  respiratoryRateTotal: ["Total rate", "/min"],
  peepCmH2O: ["PEEP", "cmH2O"],
  totalPeepCmH2O: ["Total PEEP", "cmH2O"],
  peakCmH2O: ["Peak pressure", "cmH2O"],
  plateauCmH2O: ["Plateau", "cmH2O"],
  meanAirwayPressureCmH2O: ["Mean airway pressure", "cmH2O"],
  flowLPerMin: ["Flow", "L/min"],
  hfnoFlowLPerMin: ["High flow", "L/min"],
  minuteVolumeLPerMin: ["Minute volume", "L/min"],
  pressureSupportCmH2O: ["Pressure support", "cmH2O"],
  pressureAbovePeepCmH2O: ["Pressure above PEEP", "cmH2O"],
  pHighCmH2O: ["P-high", "cmH2O"],
  pLowCmH2O: ["P-low", "cmH2O"],
  tHighS: ["T-high", "s"],
  tLowS: ["T-low", "s"],
  frequencyHz: ["Frequency", "Hz"],
  amplitudeCmH2O: ["Amplitude", "cmH2O"],
  triggerLPerMin: ["Flow trigger", "L/min"],
  triggerCmH2O: ["Pressure trigger", "cmH2O"],
  inspiratoryTimeS: ["Inspiratory time", "s"],
  inspiratoryToExpiratory: ["I:E", ""],
  pesEndInspiratoryCmH2O: ["End-inspiratory oesophageal pressure", "cmH2O"],
  pesEndExpiratoryCmH2O: ["End-expiratory oesophageal pressure", "cmH2O"],
  cuffCmH2O: ["Cuff pressure", "cmH2O"],
  pao2MmHg: ["PaO2", "mmHg"],
  paco2MmHg: ["PaCO2", "mmHg"],
  ph: ["pH", ""],
  hco3MmolPerL: ["HCO3", "mmol/L"],
  sao2Percent: ["SaO2", "%"],
  lactateMmolPerL: ["Lactate", "mmol/L"],
  spo2Percent: ["SpO2", "%"],
  etco2MmHg: ["EtCO2", "mmHg"],
  heartRate: ["Heart rate", "/min"],
  systolicMmHg: ["Systolic pressure", "mmHg"],
  mapMmHg: ["MAP", "mmHg"],
  cvpMmHg: ["CVP", "mmHg"],
  paopMmHg: ["PAOP", "mmHg"],
  urineMlPerKgPerH: ["Urine", "mL/kg/h"],
  heightCm: ["Height", "cm"],
  ulnaCm: ["Ulna length", "cm"],
  demispanCm: ["Demispan", "cm"],
  kneeHeightCm: ["Knee height", "cm"],
  weightKg: ["Weight", "kg"],
  temperatureC: ["Temperature", "°C"],
  headOfBedDegrees: ["Head of bed", "°"],
};

export function wordsOf(field: ChartedField): string {
  return fieldWords[field][0];
}

export function unitOf(field: ChartedField): string {
  return fieldWords[field][1];
}
