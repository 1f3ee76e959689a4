import * as physiology from "@/lib/physiology";

type Range = readonly [min: number, max: number];

/** A function that takes numbers alone, with every argument's allowed range and one accepted call. */
export interface Entry {
  name: string;
  call: (input: Record<string, unknown>) => number;
  ranges: Readonly<Record<string, Range>>;
  example: Readonly<Record<string, unknown>>;
  result: number;
}

const volume: Range = [20, 2000];
const rate: Range = [1, 150];
const plateau: Range = [2, 100];
const peak: Range = [2, 120];
const totalPeep: Range = [0, 60];
const peep: Range = [0, 50];
const pbw: Range = [16, 139];
const fio2: Range = [0.21, 1];
const pao2: Range = [10, 700];
const paco2: Range = [8, 250];
const spo2: Range = [30, 100];
const mean: Range = [0, 80];
const age: Range = [16, 120];
const barometric: Range = [400, 800];
const quotient: Range = [0.6, 1.3];
const pf: Range = [10, 3334];

type Numeric = (input: never) => number;

function entry(
  name: keyof typeof physiology,
  ranges: Entry["ranges"],
  example: Entry["example"],
  result: number,
): Entry {
  const call = physiology[name] as Numeric as Entry["call"];
  return { name, call, ranges, example, result };
}

/** Ranges and results as the documentation of each function states them. */
export const catalogue: readonly Entry[] = [
  entry("predictedBodyWeightKg", { heightCm: [120, 250] }, { sex: "male", heightCm: 175 }, 70.566),
  entry("heightFromUlnaCm", { ulnaCm: [18.5, 32], ageYears: age }, { sex: "male", ageYears: 58, ulnaCm: 26 }, 172.8),
  entry(
    "heightFromDemispanCm",
    { demispanCm: [50, 120], ageYears: age },
    { sex: "male", ageYears: 60, demispanCm: 84 },
    171.8,
  ),
  entry(
    "heightFromKneeHeightCm",
    { kneeHeightCm: [30, 75], ageYears: [60, 90] },
    { sex: "male", ageYears: 70, kneeHeightCm: 50 },
    162.39,
  ),
  entry("tidalVolumePerKg", { tidalVolumeMl: volume, pbwKg: pbw }, { tidalVolumeMl: 420, pbwKg: 70 }, 6),
  entry(
    "exhaledVolumePerKg",
    { exhaledTidalVolumeMl: [10, 2000], pbwKg: pbw },
    { exhaledTidalVolumeMl: 350, pbwKg: 70 },
    5,
  ),
  entry(
    "minuteVolumeLPerMin",
    { tidalVolumeMl: volume, respiratoryRate: rate },
    { tidalVolumeMl: 420, respiratoryRate: 20 },
    8.4,
  ),
  entry(
    "expiratoryTimeS",
    { respiratoryRate: rate, inspiratoryTimeS: [0.1, 10] },
    { respiratoryRate: 24, inspiratoryTimeS: 0.72 },
    1.78,
  ),
  entry(
    "drivingPressureCmH2O",
    { plateauCmH2O: plateau, totalPeepCmH2O: totalPeep },
    { plateauCmH2O: 27, totalPeepCmH2O: 12 },
    15,
  ),
  entry(
    "staticComplianceMlPerCmH2O",
    { tidalVolumeMl: volume, plateauCmH2O: plateau, totalPeepCmH2O: totalPeep },
    { tidalVolumeMl: 420, plateauCmH2O: 25, totalPeepCmH2O: 10 },
    28,
  ),
  entry(
    "dynamicComplianceMlPerCmH2O",
    { tidalVolumeMl: volume, peakCmH2O: peak, totalPeepCmH2O: totalPeep },
    { tidalVolumeMl: 450, peakCmH2O: 35, totalPeepCmH2O: 10 },
    18,
  ),
  entry(
    "airwayResistanceCmH2OPerLPerS",
    { peakCmH2O: peak, plateauCmH2O: plateau, flowLPerMin: [5, 200] },
    { peakCmH2O: 35, plateauCmH2O: 25, flowLPerMin: 60 },
    10,
  ),
  entry("intrinsicPeepCmH2O", { totalPeepCmH2O: totalPeep, peepCmH2O: peep }, { totalPeepCmH2O: 14, peepCmH2O: 8 }, 6),
  entry(
    "mechanicalPowerVolumeControlJPerMin",
    {
      respiratoryRate: rate,
      tidalVolumeMl: volume,
      peakCmH2O: peak,
      plateauCmH2O: plateau,
      totalPeepCmH2O: totalPeep,
    },
    { respiratoryRate: 20, tidalVolumeMl: 450, peakCmH2O: 30, plateauCmH2O: 23, totalPeepCmH2O: 10 },
    20.727,
  ),
  entry(
    "mechanicalPowerPressureControlJPerMin",
    { respiratoryRate: rate, tidalVolumeMl: volume, pressureAbovePeepCmH2O: [1, 80], peepCmH2O: peep },
    { respiratoryRate: 20, tidalVolumeMl: 450, pressureAbovePeepCmH2O: 15, peepCmH2O: 10 },
    22.05,
  ),
  entry(
    "ventilatoryRatio",
    { minuteVolumeLPerMin: [0.1, 60], paco2MmHg: paco2, pbwKg: pbw },
    { minuteVolumeLPerMin: 7, paco2MmHg: 37.5, pbwKg: 70 },
    1,
  ),
  entry(
    "deadSpaceFractionEnghoff",
    { paco2MmHg: paco2, mixedExpiredCo2MmHg: [0, 250] },
    { paco2MmHg: 40, mixedExpiredCo2MmHg: 28 },
    0.3,
  ),
  entry(
    "predictedPaco2MmHg",
    {
      paco2MmHg: paco2,
      fromTidalVolumeMl: volume,
      fromRespiratoryRate: rate,
      toTidalVolumeMl: volume,
      toRespiratoryRate: rate,
      deadSpaceMl: [0, 2000],
    },
    {
      paco2MmHg: 60,
      fromTidalVolumeMl: 420,
      fromRespiratoryRate: 20,
      toTidalVolumeMl: 420,
      toRespiratoryRate: 25,
      deadSpaceMl: 150,
    },
    48,
  ),
  entry("predictedPh", { paco2MmHg: paco2, hco3MmolPerL: [1, 80] }, { paco2MmHg: 40, hco3MmolPerL: 24 }, 7.391),
  entry("pfRatio", { pao2MmHg: pao2, fio2 }, { pao2MmHg: 56, fio2: 0.28 }, 200),
  entry("sfRatio", { spo2Percent: spo2, fio2 }, { spo2Percent: 94, fio2: 0.4 }, 235),
  entry(
    "altitudeAdjustedPf",
    { pfRatio: pf, barometricPressureMmHg: barometric },
    { pfRatio: 132, barometricPressureMmHg: 570 },
    176,
  ),
  entry(
    "oxygenationIndex",
    { fio2, meanAirwayPressureCmH2O: mean, pao2MmHg: pao2 },
    { fio2: 0.6, meanAirwayPressureCmH2O: 15, pao2MmHg: 75 },
    12,
  ),
  entry(
    "oxygenSaturationIndex",
    { fio2, meanAirwayPressureCmH2O: mean, spo2Percent: spo2 },
    { fio2: 0.5, meanAirwayPressureCmH2O: 12, spo2Percent: 96 },
    6.25,
  ),
  entry(
    "alveolarPo2MmHg",
    { fio2, paco2MmHg: paco2, barometricPressureMmHg: barometric, respiratoryQuotient: quotient },
    { fio2: 0.6, paco2MmHg: 45, barometricPressureMmHg: 760, respiratoryQuotient: 0.8 },
    371.55,
  ),
  entry(
    "alveolarArterialGradientMmHg",
    { fio2, paco2MmHg: paco2, barometricPressureMmHg: barometric, respiratoryQuotient: quotient, pao2MmHg: pao2 },
    { fio2: 0.6, paco2MmHg: 45, barometricPressureMmHg: 760, respiratoryQuotient: 0.8, pao2MmHg: 80 },
    291.55,
  ),
  entry(
    "rapidShallowBreathingIndex",
    { respiratoryRate: rate, tidalVolumeMl: volume },
    { respiratoryRate: 30, tidalVolumeMl: 250 },
    120,
  ),
  entry(
    "roxIndex",
    { spo2Percent: spo2, fio2, respiratoryRate: rate },
    { spo2Percent: 95, fio2: 0.5, respiratoryRate: 25 },
    7.6,
  ),
];
