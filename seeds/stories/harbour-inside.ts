import { h, type Story } from "../story";
import { rounds } from "./routine";

const team = { therapist: "therapist", nurse: "nurse" } as const;

/** Bed 4: inside, with a plateau that was read wrong, voided and charted anew. */
const voidedEntry: Story = {
  unit: "harbour",
  bed: "4",
  admittedBy: "therapist",
  admittedHoursAgo: h(71),
  patient: { mrn: "30073319", name: "Helen Brandt", birthDate: "1972-02-08", reasonForVentilation: "Pneumonia" },
  intubatedHoursAgo: h(71, 30),
  events: [
    { hoursAgo: h(70, 40), by: "nurse", height: { method: "document", sexForPbw: "female", heightCm: 170 } },
    {
      hoursAgo: h(70, 30),
      by: "therapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 400,
        respiratoryRate: 18,
        peepCmH2O: 8,
        fio2: 0.5,
        inspiratoryTimeS: 0.9,
        flowLPerMin: 45,
        flowPattern: "square",
      },
      mechanics: {
        exhaledTidalVolumeMl: 394,
        respiratoryRateTotal: 18,
        peakCmH2O: 28,
        plateauCmH2O: 20,
        hold: "relaxed",
      },
      observations: { spo2Percent: 94, heartRate: 86, systolicMmHg: 122, mapMmHg: 80 },
    },
    ...rounds({
      ...team,
      from: h(66),
      to: h(9),
      mechanics: {
        exhaledTidalVolumeMl: 394,
        respiratoryRateTotal: 18,
        peakCmH2O: 28,
        plateauCmH2O: 20,
        hold: "relaxed",
      },
      observations: { spo2Percent: 94, heartRate: 84, systolicMmHg: 122, mapMmHg: 80 },
    }),
    { hoursAgo: h(8, 10), by: "therapist", settings: { fio2: 0.4, peepCmH2O: 6 } },
    {
      hoursAgo: h(6, 5),
      by: "therapist",
      label: "misread",
      mechanics: {
        exhaledTidalVolumeMl: 396,
        respiratoryRateTotal: 18,
        peakCmH2O: 82,
        plateauCmH2O: 81,
        hold: "relaxed",
      },
    },
    { hoursAgo: h(6), by: "therapist", voids: "misread", reason: "Digits turned round" },
    {
      hoursAgo: h(5, 55),
      by: "therapist",
      mechanics: {
        exhaledTidalVolumeMl: 396,
        respiratoryRateTotal: 18,
        peakCmH2O: 28,
        plateauCmH2O: 18,
        hold: "relaxed",
      },
    },
    {
      hoursAgo: h(2, 10),
      by: "therapist",
      mechanics: {
        exhaledTidalVolumeMl: 398,
        respiratoryRateTotal: 18,
        peakCmH2O: 27,
        plateauCmH2O: 18,
        hold: "relaxed",
      },
      check: true,
    },
    {
      hoursAgo: h(0, 35),
      by: "nurse",
      observations: { spo2Percent: 95, heartRate: 82, systolicMmHg: 124, mapMmHg: 82 },
    },
  ],
};

/** Bed 5: inside, the next hold overdue. */
const holdOverdue: Story = {
  unit: "harbour",
  bed: "5",
  admittedBy: "intensivist",
  admittedHoursAgo: h(22),
  patient: {
    mrn: "30035128",
    name: "Mirjana Petek",
    birthDate: "1953-04-26",
    reasonForVentilation: "Pneumonia",
    ardsRiskFactor: "Pneumonia",
  },
  intubatedHoursAgo: h(22, 30),
  events: [
    { hoursAgo: h(21, 50), by: "therapist", height: { method: "measured-lying", sexForPbw: "female", heightCm: 162 } },
    {
      hoursAgo: h(21, 40),
      by: "therapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 340,
        respiratoryRate: 22,
        peepCmH2O: 10,
        fio2: 0.5,
        inspiratoryTimeS: 0.8,
        flowLPerMin: 45,
        flowPattern: "square",
      },
      mechanics: {
        exhaledTidalVolumeMl: 336,
        respiratoryRateTotal: 22,
        peakCmH2O: 31,
        plateauCmH2O: 23,
        hold: "relaxed",
      },
      observations: { spo2Percent: 94, heartRate: 96, systolicMmHg: 116, mapMmHg: 74 },
    },
    ...rounds({
      ...team,
      from: h(20, 30),
      to: h(4, 30),
      mechanics: {
        exhaledTidalVolumeMl: 336,
        respiratoryRateTotal: 22,
        peakCmH2O: 31,
        plateauCmH2O: 23,
        hold: "relaxed",
      },
      observations: { spo2Percent: 94, heartRate: 94, systolicMmHg: 118, mapMmHg: 75 },
    }),
    {
      hoursAgo: h(1, 10),
      by: "therapist",
      mechanics: { exhaledTidalVolumeMl: 335, respiratoryRateTotal: 22 },
      check: true,
    },
    {
      hoursAgo: h(0, 10),
      by: "nurse",
      observations: { spo2Percent: 94, heartRate: 92, systolicMmHg: 118, mapMmHg: 75 },
    },
  ],
};

/** Bed 6: pressure control that ends at zero flow, which counts as a hold. */
const zeroFlow: Story = {
  unit: "harbour",
  bed: "6",
  admittedBy: "therapist",
  admittedHoursAgo: h(64),
  patient: { mrn: "30080852", name: "Elif Aydin", birthDate: "1956-01-03", reasonForVentilation: "Pneumonia" },
  intubatedHoursAgo: h(64, 30),
  events: [
    { hoursAgo: h(63, 50), by: "nurse", height: { method: "measured-lying", sexForPbw: "female", heightCm: 157 } },
    {
      hoursAgo: h(63, 40),
      by: "therapist",
      settings: {
        mode: "A/C-PC",
        pressureAbovePeepCmH2O: 12,
        respiratoryRate: 16,
        peepCmH2O: 6,
        fio2: 0.35,
        inspiratoryTimeS: 1,
      },
      mechanics: { exhaledTidalVolumeMl: 330, respiratoryRateTotal: 17, peakCmH2O: 18, endInspiratoryFlowZero: true },
      observations: { spo2Percent: 95, heartRate: 78, systolicMmHg: 132, mapMmHg: 88 },
    },
    ...rounds({
      ...team,
      from: h(60),
      to: h(6),
      mechanics: { exhaledTidalVolumeMl: 330, respiratoryRateTotal: 17, endInspiratoryFlowZero: true },
      observations: { spo2Percent: 94, heartRate: 76, systolicMmHg: 130, mapMmHg: 86 },
    }),
    {
      hoursAgo: h(1, 5),
      by: "therapist",
      mechanics: { exhaledTidalVolumeMl: 332, respiratoryRateTotal: 17, peakCmH2O: 18, endInspiratoryFlowZero: true },
      check: true,
    },
    {
      hoursAgo: h(0, 40),
      by: "nurse",
      observations: { spo2Percent: 95, heartRate: 76, systolicMmHg: 130, mapMmHg: 86 },
    },
  ],
};

/** Bed 8: inside, with a height estimated from the ulna. */
const estimatedHeight: Story = {
  unit: "harbour",
  bed: "8",
  admittedBy: "intensivist",
  admittedHoursAgo: h(34),
  patient: { mrn: "30027060", name: "Anna Viklund", birthDate: "1982-03-29", reasonForVentilation: "Overdose" },
  intubatedHoursAgo: h(34, 20),
  events: [
    { hoursAgo: h(33, 40), by: "nurse", height: { method: "ulna", sexForPbw: "female", ulnaCm: 25.5 } },
    {
      hoursAgo: h(33, 30),
      by: "therapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 400,
        respiratoryRate: 16,
        peepCmH2O: 5,
        fio2: 0.35,
        inspiratoryTimeS: 0.9,
        flowLPerMin: 45,
        flowPattern: "square",
      },
      mechanics: {
        exhaledTidalVolumeMl: 395,
        respiratoryRateTotal: 16,
        peakCmH2O: 23,
        plateauCmH2O: 15,
        hold: "relaxed",
      },
      observations: { spo2Percent: 96, heartRate: 74, systolicMmHg: 118, mapMmHg: 78 },
    },
    ...rounds({
      ...team,
      from: h(30),
      to: h(6),
      mechanics: {
        exhaledTidalVolumeMl: 395,
        respiratoryRateTotal: 16,
        peakCmH2O: 23,
        plateauCmH2O: 15,
        hold: "relaxed",
      },
      observations: { spo2Percent: 95, heartRate: 72, systolicMmHg: 118, mapMmHg: 78 },
    }),
    {
      hoursAgo: h(1, 30),
      by: "therapist",
      mechanics: {
        exhaledTidalVolumeMl: 396,
        respiratoryRateTotal: 16,
        peakCmH2O: 23,
        plateauCmH2O: 15,
        hold: "relaxed",
      },
      check: true,
    },
    {
      hoursAgo: h(0, 30),
      by: "nurse",
      observations: { spo2Percent: 96, heartRate: 72, systolicMmHg: 120, mapMmHg: 80 },
    },
  ],
};

export const harbourInside = [voidedEntry, holdOverdue, zeroFlow, estimatedHeight];
