import type { Worksheet } from "@/lib/contracts";

/** Invented: the patient of the tests, at a bedside in Berlin, at 14:20 by the unit's clock. */
export const testNow = "2026-12-01T14:20:10+01:00";
const charted = "2026-12-01T10:30:00+01:00";
const author = { id: "2", name: "Mara Okafor" };
const value = <Kind extends number | string>(of: Kind, entryId: string) => ({
  value: of,
  entryId,
  chartedAt: charted,
  recordedAt: charted,
  author,
});
const fact = (id: string, fields: object, chartedAt = charted) => ({
  id,
  chartedAt,
  recordedAt: chartedAt,
  author,
  ...fields,
});

export const settingsCharted = {
  mode: "A/C-VC",
  tidalVolumeMl: 420,
  respiratoryRate: 24,
  peepCmH2O: 10,
  fio2: 0.6,
  inspiratoryTimeS: 0.8,
  flowLPerMin: 45,
  flowPattern: "decelerating",
} as const;

const readingCharted = {
  plateauCmH2O: 24,
  hold: "relaxed",
  peakCmH2O: 31,
  exhaledTidalVolumeMl: 415,
  respiratoryRateTotal: 24,
} as const;

const everySetting = [...Object.keys(settingsCharted), "pressureAbovePeepCmH2O", "pressureSupportCmH2O"];

const everyRight: Worksheet["can"] = {
  settingsFields: everySetting,
  correct: true,
  moveBed: true,
  endEpisode: true,
  settings: true,
  "settings-checks": true,
  mechanics: true,
  observations: true,
  heights: true,
};

export const nurseRights: Worksheet["can"] = {
  ...everyRight,
  settingsFields: ["fio2"],
  "settings-checks": false,
  mechanics: false,
  moveBed: false,
  endEpisode: false,
};

export const noRights: Worksheet["can"] = {
  ...nurseRights,
  settingsFields: [],
  settings: false,
  observations: false,
  heights: false,
};

/** PBW of a man of 175 cm. Source: reference vector 01-pbw-003. */
const pbwKg = 70.566;

/** A whole worksheet of one patient in A/C-VC whose plateau was read at 10:30, ordered 5 to 7 mL/kg. */
export function buildWorksheet(overrides: Partial<Worksheet> = {}): Worksheet {
  const valuesOf = (fields: object, entryId: string) =>
    Object.fromEntries(Object.entries(fields).map(([name, of]) => [name, value(of as number | string, entryId)]));
  return {
    patient: { id: "71", name: "Dmitri Kaplan", birthDate: "1968-03-12", mrn: "30044417", ageYears: 58 },
    episode: {
      id: "81",
      intubatedAt: "2026-11-29T08:00:00+01:00",
      day: 3,
      bed: { id: "7", label: "7" },
      pausedSince: null,
      endedAt: null,
      pauses: [],
    },
    height: { heightCm: 175, method: "measured-lying", sexForPbw: "male", ...value("", "90") } as Worksheet["height"],
    pbwKg,
    pbwAlternatives: null,
    targets: {
      origin: "order",
      conditions: [],
      vtMlPerKg: { min: 5, max: 7, goal: 6 },
      vtMl: null,
      plateauCmH2O: { max: 30 },
      drivingPressureCmH2O: { max: 15 },
      spo2Percent: { min: 88, max: 95 },
      pao2MmHg: { min: 55, max: 80 },
      ph: { min: 7.3, max: 7.45 },
      paco2MmHg: null,
      respiratoryRate: { max: 35 },
      peepTable: "lower",
      orderedBy: { id: "3", name: "Ines Lindqvist" },
      recordedAt: "2026-11-30T09:00:00+01:00",
    },
    unit: {
      id: "1",
      name: "Invented unit",
      timeZone: "Europe/Berlin",
      gasUnit: "mmHg",
      barometricPressureMmHg: 760,
      nursesSetVentilators: false,
      intervals: {},
      steps: { tidalVolumeMl: 10 },
    },
    settings: valuesOf(settingsCharted, "101"),
    settingsCheckedAt: null,
    mechanics: valuesOf(readingCharted, "102"),
    observations: null,
    bloodGas: null,
    position: null,
    derived: {},
    findings: [],
    nextSteps: [],
    due: [],
    measured: {},
    group: "inside",
    causes: [],
    validUntil: null,
    at: testNow,
    can: everyRight,
    facts: {
      settings: [fact("101", settingsCharted)],
      mechanics: [fact("102", readingCharted)],
      heights: [fact("90", { heightCm: 175, method: "measured-lying", sexForPbw: "male" })],
    },
    ...overrides,
  };
}
