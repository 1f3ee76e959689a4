import { h, type Story } from "../story";
import { rounds } from "./routine";

const team = { therapist: "therapist", nurse: "nurse" } as const;

/** Bed 3: volume raised for breath stacking; plateau 31, 8.9 mL/kg, nobody has answered. */
const unanswered: Story = {
  unit: "harbour",
  bed: "3",
  admittedBy: "intensivist",
  admittedHoursAgo: h(27),
  patient: {
    mrn: "30012093",
    name: "Rosa Albrecht",
    birthDate: "1960-05-21",
    reasonForVentilation: "Sepsis",
    ardsRiskFactor: "Sepsis, abdominal",
  },
  intubatedHoursAgo: h(27, 20),
  events: [
    { hoursAgo: h(26, 50), by: "nurse", height: { method: "document", sexForPbw: "female", heightCm: 158 } },
    {
      hoursAgo: h(26, 40),
      by: "therapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 380,
        respiratoryRate: 22,
        peepCmH2O: 8,
        fio2: 0.6,
        inspiratoryTimeS: 0.8,
        flowLPerMin: 50,
        flowPattern: "square",
      },
      mechanics: {
        exhaledTidalVolumeMl: 374,
        respiratoryRateTotal: 22,
        peakCmH2O: 30,
        plateauCmH2O: 22,
        hold: "relaxed",
      },
      observations: { spo2Percent: 93, heartRate: 108, systolicMmHg: 104, mapMmHg: 68 },
    },
    ...rounds({
      ...team,
      from: h(24),
      to: h(6),
      mechanics: {
        exhaledTidalVolumeMl: 374,
        respiratoryRateTotal: 24,
        peakCmH2O: 32,
        plateauCmH2O: 22,
        totalPeepCmH2O: 8,
        hold: "relaxed",
      },
      observations: { spo2Percent: 93, heartRate: 104, systolicMmHg: 106, mapMmHg: 69 },
    }),
    {
      hoursAgo: h(2, 40),
      by: "therapist",
      settings: { tidalVolumeMl: 450, fio2: 0.7 },
      mechanics: { exhaledTidalVolumeMl: 444, respiratoryRateTotal: 23, breathStacking: true },
      reason: "Breath stacking",
    },
    {
      hoursAgo: h(0, 45),
      by: "therapist",
      mechanics: {
        exhaledTidalVolumeMl: 446,
        respiratoryRateTotal: 23,
        peakCmH2O: 38,
        plateauCmH2O: 31,
        totalPeepCmH2O: 8,
        hold: "relaxed",
      },
      check: true,
    },
    {
      hoursAgo: h(0, 20),
      by: "nurse",
      observations: { spo2Percent: 94, heartRate: 110, systolicMmHg: 102, mapMmHg: 66 },
    },
  ],
};

/** Bed 10: plateau 31 last, then the volume was changed and nobody has measured since. */
const notMeasuredSince: Story = {
  unit: "harbour",
  bed: "10",
  admittedBy: "therapist",
  admittedHoursAgo: h(52),
  patient: {
    mrn: "30053380",
    name: "Samuel Nkemelu",
    birthDate: "1967-09-02",
    reasonForVentilation: "Aspiration",
    ardsRiskFactor: "Aspiration",
  },
  intubatedHoursAgo: h(53),
  events: [
    { hoursAgo: h(51, 50), by: "therapist", height: { method: "measured-lying", sexForPbw: "male", heightCm: 172.5 } },
    {
      hoursAgo: h(51, 30),
      by: "therapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 480,
        respiratoryRate: 18,
        peepCmH2O: 8,
        fio2: 0.5,
        inspiratoryTimeS: 0.9,
        flowLPerMin: 50,
        flowPattern: "square",
      },
      mechanics: {
        exhaledTidalVolumeMl: 473,
        respiratoryRateTotal: 18,
        peakCmH2O: 32,
        plateauCmH2O: 22,
        hold: "relaxed",
      },
      observations: { spo2Percent: 95, heartRate: 88, systolicMmHg: 124, mapMmHg: 80 },
    },
    ...rounds({
      ...team,
      from: h(47),
      to: h(11),
      mechanics: {
        exhaledTidalVolumeMl: 473,
        respiratoryRateTotal: 19,
        peakCmH2O: 32,
        plateauCmH2O: 22,
        hold: "relaxed",
      },
      observations: { spo2Percent: 94, heartRate: 90, systolicMmHg: 122, mapMmHg: 79 },
    }),
    {
      hoursAgo: h(6, 30),
      by: "therapist",
      settings: { peepCmH2O: 10 },
      mechanics: {
        exhaledTidalVolumeMl: 470,
        respiratoryRateTotal: 19,
        peakCmH2O: 36,
        plateauCmH2O: 28,
        hold: "relaxed",
      },
    },
    {
      hoursAgo: h(2, 35),
      by: "therapist",
      mechanics: {
        exhaledTidalVolumeMl: 472,
        respiratoryRateTotal: 19,
        peakCmH2O: 38,
        plateauCmH2O: 31,
        totalPeepCmH2O: 10,
        hold: "relaxed",
      },
    },
    { hoursAgo: h(2, 20), by: "therapist", settings: { tidalVolumeMl: 410, respiratoryRate: 22 } },
    {
      hoursAgo: h(0, 25),
      by: "nurse",
      observations: { spo2Percent: 94, heartRate: 94, systolicMmHg: 120, mapMmHg: 77 },
    },
  ],
};

export const harbourOutside = [unanswered, notMeasuredSince];
