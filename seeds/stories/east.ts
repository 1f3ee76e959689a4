import { h, type Story } from "../story";
import { rounds } from "./routine";

const team = { therapist: "eastTherapist", nurse: "eastNurse" } as const;

/** E1: inside. */
const inside: Story = {
  unit: "east",
  bed: "E1",
  admittedBy: "eastTherapist",
  admittedHoursAgo: h(46),
  patient: { mrn: "70210044", name: "Lucía Andrade", birthDate: "1963-10-05", reasonForVentilation: "Pneumonia" },
  intubatedHoursAgo: h(46, 40),
  events: [
    { hoursAgo: h(45, 50), by: "eastNurse", height: { method: "document", sexForPbw: "female", heightCm: 160 } },
    {
      hoursAgo: h(45, 40),
      by: "eastTherapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 350,
        respiratoryRate: 20,
        peepCmH2O: 8,
        fio2: 0.5,
        inspiratoryTimeS: 0.8,
      },
      mechanics: {
        exhaledTidalVolumeMl: 346,
        respiratoryRateTotal: 20,
        peakCmH2O: 27,
        plateauCmH2O: 20,
        hold: "relaxed",
      },
      observations: { spo2Percent: 93, heartRate: 88, systolicMmHg: 120, mapMmHg: 78 },
    },
    ...rounds({
      ...team,
      from: h(42),
      to: h(6),
      mechanics: {
        exhaledTidalVolumeMl: 346,
        respiratoryRateTotal: 20,
        peakCmH2O: 27,
        plateauCmH2O: 20,
        hold: "relaxed",
      },
      observations: { spo2Percent: 93, heartRate: 86, systolicMmHg: 120, mapMmHg: 78 },
    }),
    {
      hoursAgo: h(1, 45),
      by: "eastTherapist",
      mechanics: {
        exhaledTidalVolumeMl: 347,
        respiratoryRateTotal: 20,
        peakCmH2O: 27,
        plateauCmH2O: 20,
        hold: "relaxed",
      },
      check: true,
    },
    {
      hoursAgo: h(0, 25),
      by: "eastNurse",
      observations: { spo2Percent: 93, heartRate: 86, systolicMmHg: 122, mapMmHg: 79 },
    },
  ],
};

/** E2: SpO2 below its limit. */
const lowOxygen: Story = {
  unit: "east",
  bed: "E2",
  admittedBy: "eastIntensivist",
  admittedHoursAgo: h(18),
  patient: {
    mrn: "70210871",
    name: "Mateo Quiroga",
    birthDate: "1954-12-19",
    reasonForVentilation: "Pneumonia",
    ardsRiskFactor: "Pneumonia",
  },
  intubatedHoursAgo: h(18, 30),
  events: [
    {
      hoursAgo: h(17, 50),
      by: "eastTherapist",
      height: { method: "measured-lying", sexForPbw: "male", heightCm: 168 },
    },
    {
      hoursAgo: h(17, 40),
      by: "eastTherapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 400,
        respiratoryRate: 24,
        peepCmH2O: 10,
        fio2: 0.6,
        inspiratoryTimeS: 0.8,
      },
      mechanics: {
        exhaledTidalVolumeMl: 395,
        respiratoryRateTotal: 25,
        peakCmH2O: 32,
        plateauCmH2O: 24,
        hold: "relaxed",
      },
      observations: { spo2Percent: 93, heartRate: 100, systolicMmHg: 110, mapMmHg: 72 },
    },
    ...rounds({
      ...team,
      from: h(15),
      to: h(5),
      mechanics: {
        exhaledTidalVolumeMl: 395,
        respiratoryRateTotal: 25,
        peakCmH2O: 32,
        plateauCmH2O: 24,
        hold: "relaxed",
      },
      observations: { spo2Percent: 92, heartRate: 102, systolicMmHg: 110, mapMmHg: 72 },
    }),
    {
      hoursAgo: h(1, 55),
      by: "eastTherapist",
      mechanics: {
        exhaledTidalVolumeMl: 396,
        respiratoryRateTotal: 26,
        peakCmH2O: 33,
        plateauCmH2O: 24,
        hold: "relaxed",
      },
      check: true,
    },
    {
      hoursAgo: h(0, 15),
      by: "eastNurse",
      observations: { spo2Percent: 88, heartRate: 112, systolicMmHg: 106, mapMmHg: 69 },
    },
  ],
};

/** E4: below 152.4 cm the PBW line is extrapolated; PEEP was raised after the last hold. */
const changedSince: Story = {
  unit: "east",
  bed: "E4",
  admittedBy: "eastTherapist",
  admittedHoursAgo: h(29),
  patient: { mrn: "70211356", name: "Inés Palacio", birthDate: "1992-07-14", reasonForVentilation: "Trauma" },
  intubatedHoursAgo: h(29, 15),
  events: [
    {
      hoursAgo: h(28, 50),
      by: "eastNurse",
      height: { method: "measured-standing", sexForPbw: "female", heightCm: 150 },
    },
    {
      hoursAgo: h(28, 40),
      by: "eastTherapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 300,
        respiratoryRate: 20,
        peepCmH2O: 6,
        fio2: 0.45,
        inspiratoryTimeS: 0.8,
      },
      mechanics: {
        exhaledTidalVolumeMl: 296,
        respiratoryRateTotal: 20,
        peakCmH2O: 26,
        plateauCmH2O: 19,
        hold: "relaxed",
      },
      observations: { spo2Percent: 94, heartRate: 94, systolicMmHg: 114, mapMmHg: 74 },
    },
    ...rounds({
      ...team,
      from: h(26),
      to: h(6),
      mechanics: {
        exhaledTidalVolumeMl: 296,
        respiratoryRateTotal: 20,
        peakCmH2O: 26,
        plateauCmH2O: 19,
        hold: "relaxed",
      },
      observations: { spo2Percent: 93, heartRate: 92, systolicMmHg: 114, mapMmHg: 74 },
    }),
    { hoursAgo: h(1, 20), by: "eastTherapist", settings: { peepCmH2O: 8 } },
    {
      hoursAgo: h(0, 45),
      by: "eastNurse",
      observations: { spo2Percent: 95, heartRate: 90, systolicMmHg: 116, mapMmHg: 76 },
    },
  ],
};

/** E5: inside; nobody has checked the settings for more than four hours. */
const checkOverdue: Story = {
  unit: "east",
  bed: "E5",
  admittedBy: "eastTherapist",
  admittedHoursAgo: h(60),
  patient: { mrn: "70209923", name: "Hernán Duque", birthDate: "1970-11-22", reasonForVentilation: "Stroke" },
  intubatedHoursAgo: h(60, 20),
  events: [
    { hoursAgo: h(59, 50), by: "eastNurse", height: { method: "document", sexForPbw: "male", heightCm: 176 } },
    {
      hoursAgo: h(59, 40),
      by: "eastTherapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 460,
        respiratoryRate: 16,
        peepCmH2O: 5,
        fio2: 0.35,
        inspiratoryTimeS: 0.9,
      },
      mechanics: {
        exhaledTidalVolumeMl: 455,
        respiratoryRateTotal: 16,
        peakCmH2O: 23,
        plateauCmH2O: 16,
        hold: "relaxed",
      },
      observations: { spo2Percent: 95, heartRate: 72, systolicMmHg: 140, mapMmHg: 94 },
    },
    ...rounds({
      ...team,
      from: h(56, 45),
      to: h(4, 45),
      mechanics: {
        exhaledTidalVolumeMl: 455,
        respiratoryRateTotal: 16,
        peakCmH2O: 23,
        plateauCmH2O: 16,
        hold: "relaxed",
      },
      observations: { spo2Percent: 95, heartRate: 70, systolicMmHg: 138, mapMmHg: 92 },
    }),
    {
      hoursAgo: h(1, 35),
      by: "eastTherapist",
      mechanics: {
        exhaledTidalVolumeMl: 456,
        respiratoryRateTotal: 16,
        peakCmH2O: 23,
        plateauCmH2O: 16,
        hold: "relaxed",
      },
    },
    {
      hoursAgo: h(0, 20),
      by: "eastNurse",
      observations: { spo2Percent: 96, heartRate: 70, systolicMmHg: 138, mapMmHg: 92 },
    },
  ],
};

/** E7: the last hold was done against effort and reads nothing. */
const effortSeen: Story = {
  unit: "east",
  bed: "E7",
  admittedBy: "eastIntensivist",
  admittedHoursAgo: h(12),
  patient: { mrn: "70211790", name: "Sofía Marín", birthDate: "1978-05-30", reasonForVentilation: "Sepsis" },
  intubatedHoursAgo: h(12, 20),
  events: [
    { hoursAgo: h(11, 50), by: "eastNurse", height: { method: "measured-lying", sexForPbw: "female", heightCm: 164 } },
    {
      hoursAgo: h(11, 40),
      by: "eastTherapist",
      settings: {
        mode: "A/C-VC",
        tidalVolumeMl: 370,
        respiratoryRate: 20,
        peepCmH2O: 8,
        fio2: 0.5,
        inspiratoryTimeS: 0.8,
      },
      mechanics: {
        exhaledTidalVolumeMl: 366,
        respiratoryRateTotal: 22,
        peakCmH2O: 29,
        plateauCmH2O: 22,
        hold: "relaxed",
      },
      observations: { spo2Percent: 94, heartRate: 98, systolicMmHg: 108, mapMmHg: 70 },
    },
    ...rounds({
      ...team,
      from: h(10),
      to: h(5),
      mechanics: {
        exhaledTidalVolumeMl: 366,
        respiratoryRateTotal: 24,
        peakCmH2O: 29,
        plateauCmH2O: 22,
        hold: "relaxed",
      },
      observations: { spo2Percent: 93, heartRate: 98, systolicMmHg: 108, mapMmHg: 70 },
    }),
    {
      hoursAgo: h(1, 15),
      by: "eastTherapist",
      mechanics: {
        exhaledTidalVolumeMl: 372,
        respiratoryRateTotal: 27,
        peakCmH2O: 30,
        plateauCmH2O: 27,
        hold: "effort",
      },
      check: true,
    },
    {
      hoursAgo: h(0, 20),
      by: "eastNurse",
      observations: { spo2Percent: 94, heartRate: 104, systolicMmHg: 110, mapMmHg: 72 },
    },
  ],
};

export const east = [inside, lowOxygen, changedSince, checkOverdue, effortSeen];
