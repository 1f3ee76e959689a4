import { h, type Story } from "../story";
import { rounds } from "./routine";

const team = { therapist: "therapist", nurse: "nurse" } as const;

/** Bed 1: settings charted, no height yet and no hold. */
const noHeight: Story = {
  unit: "harbour",
  bed: "1",
  admittedBy: "therapist",
  admittedHoursAgo: h(1, 35),
  patient: {
    mrn: "30099904",
    name: "Kwame Owusu",
    birthDate: "1979-01-17",
    reasonForVentilation: "Trauma",
  },
  intubatedHoursAgo: h(1, 45),
  events: [
    {
      hoursAgo: h(1, 25),
      by: "therapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 480,
        respiratoryRate: 18,
        peepCmH2O: 8,
        fio2: 0.6,
        inspiratoryTimeS: 0.9,
      },
      mechanics: { exhaledTidalVolumeMl: 476, respiratoryRateTotal: 18, peakCmH2O: 28 },
      observations: { spo2Percent: 95, heartRate: 112, systolicMmHg: 108, mapMmHg: 70 },
    },
    {
      hoursAgo: h(0, 30),
      by: "nurse",
      observations: { spo2Percent: 94, heartRate: 106, systolicMmHg: 110, mapMmHg: 72 },
    },
  ],
};

/** Bed 2: pressure control; the pressure was raised after the last hold. */
const changedSince: Story = {
  unit: "harbour",
  bed: "2",
  admittedBy: "intensivist",
  admittedHoursAgo: h(70),
  patient: {
    mrn: "30061187",
    name: "Tomasz Wolski",
    birthDate: "1991-08-30",
    reasonForVentilation: "Pancreatitis",
    ardsRiskFactor: "Pancreatitis",
  },
  intubatedHoursAgo: h(71),
  events: [
    { hoursAgo: h(69, 45), by: "therapist", height: { method: "measured-lying", sexForPbw: "male", heightCm: 180 } },
    {
      hoursAgo: h(69, 30),
      by: "therapist",
      settings: {
        mode: "A/C-PC",
        pressureAbovePeepCmH2O: 12,
        respiratoryRate: 18,
        peepCmH2O: 8,
        fio2: 0.45,
        inspiratoryTimeS: 1,
      },
      mechanics: { exhaledTidalVolumeMl: 432, respiratoryRateTotal: 18, endInspiratoryFlowZero: true, hold: "relaxed" },
      observations: { spo2Percent: 95, heartRate: 84, systolicMmHg: 128, mapMmHg: 84 },
    },
    ...rounds({
      ...team,
      from: h(65),
      to: h(7),
      mechanics: {
        exhaledTidalVolumeMl: 432,
        respiratoryRateTotal: 18,
        peakCmH2O: 21,
        plateauCmH2O: 20,
        hold: "relaxed",
      },
      observations: { spo2Percent: 94, heartRate: 82, systolicMmHg: 126, mapMmHg: 82 },
    }),
    { hoursAgo: h(3, 5), by: "therapist", settings: { pressureAbovePeepCmH2O: 14 } },
    { hoursAgo: h(0, 50), by: "therapist", mechanics: { exhaledTidalVolumeMl: 476, respiratoryRateTotal: 18 } },
    {
      hoursAgo: h(0, 15),
      by: "nurse",
      observations: { spo2Percent: 95, heartRate: 80, systolicMmHg: 126, mapMmHg: 82 },
    },
  ],
};

/** Bed 11: admitted, nothing charted yet. */
const nothingCharted: Story = {
  unit: "harbour",
  bed: "11",
  admittedBy: "therapist",
  admittedHoursAgo: h(0, 25),
  patient: { mrn: "30047715", name: "Jonas Tamm", birthDate: "1985-06-11" },
  intubatedHoursAgo: h(0, 50),
  events: [],
};

export const harbourUnmeasured = [noHeight, changedSince, nothingCharted];
