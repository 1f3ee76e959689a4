import { h, type Story } from "../story";
import { rounds } from "./routine";

const team = { therapist: "therapist", nurse: "nurse" } as const;

/** Bed 7, as the record form opens: PEEP 10, plateau 24 relaxed, driving pressure 14, all inside. */
export const kaplan: Story = {
  unit: "harbour",
  bed: "7",
  admittedBy: "intensivist",
  admittedHoursAgo: h(30, 50),
  patient: {
    mrn: "30044417",
    name: "Dmitri Kaplan",
    birthDate: "1968-03-12",
    reasonForVentilation: "Pneumonia",
    ardsRiskFactor: "Pneumonia",
    tubeSizeMm: 8,
    tubeDepthCm: 23,
  },
  intubatedHoursAgo: h(31),
  events: [
    {
      hoursAgo: h(30, 40),
      by: "therapist",
      height: { method: "measured-lying", sexForPbw: "male", heightCm: 175 },
    },
    {
      hoursAgo: h(30, 30),
      by: "therapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 480,
        respiratoryRate: 20,
        peepCmH2O: 8,
        fio2: 0.7,
        inspiratoryTimeS: 0.9,
        flowLPerMin: 45,
        flowPattern: "decelerating",
        triggerType: "flow",
        triggerLPerMin: 2,
      },
      mechanics: {
        exhaledTidalVolumeMl: 472,
        respiratoryRateTotal: 20,
        peakCmH2O: 33,
        plateauCmH2O: 26,
        hold: "relaxed",
      },
      observations: { spo2Percent: 92, heartRate: 104, systolicMmHg: 112, mapMmHg: 72 },
    },
    {
      hoursAgo: h(26, 15),
      by: "therapist",
      settings: { tidalVolumeMl: 420, respiratoryRate: 24, peepCmH2O: 10, fio2: 0.6, inspiratoryTimeS: 0.8 },
      mechanics: {
        exhaledTidalVolumeMl: 414,
        respiratoryRateTotal: 24,
        peakCmH2O: 31,
        plateauCmH2O: 24,
        hold: "relaxed",
      },
    },
    ...rounds({
      ...team,
      from: h(25, 50),
      to: h(5),
      mechanics: {
        exhaledTidalVolumeMl: 414,
        respiratoryRateTotal: 24,
        peakCmH2O: 31,
        plateauCmH2O: 24,
        hold: "relaxed",
      },
      observations: { spo2Percent: 93, heartRate: 92, systolicMmHg: 118, mapMmHg: 76 },
    }),
    {
      hoursAgo: h(1, 50),
      by: "therapist",
      mechanics: {
        exhaledTidalVolumeMl: 415,
        respiratoryRateTotal: 24,
        peakCmH2O: 31,
        plateauCmH2O: 24,
        hold: "relaxed",
      },
      check: true,
    },
    {
      hoursAgo: h(0, 20),
      by: "nurse",
      observations: { spo2Percent: 93, heartRate: 92, systolicMmHg: 118, mapMmHg: 76 },
    },
  ],
};
