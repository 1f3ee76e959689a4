import type { Targets } from "./targets";

/** O1: a starting set fills an order; the order's own numbers hold. Numbers are starting values, from memory. */
export interface StartingSet {
  name: string;
  targets: Omit<Targets, "origin" | "recordedAt" | "set">;
}

const noInjury = {
  conditions: [],
  vtMlPerKg: { min: 4, max: 8, goal: { min: 6, max: 8 } },
  vtMl: null,
  plateauCmH2O: { max: 30 },
  drivingPressureCmH2O: { max: 15 },
  spo2Percent: { min: 92, max: 96 },
  pao2MmHg: { min: 60, max: 100 },
  ph: { min: 7.3, max: 7.45 },
  paco2MmHg: null,
  respiratoryRate: { max: 35 },
  peepTable: "none",
} satisfies StartingSet["targets"];

const sixToEight = { ...noInjury, vtMlPerKg: { min: 6, max: 8 } } as const;

const obstructive = {
  ...sixToEight,
  drivingPressureCmH2O: null,
  ph: { min: 7.2 },
  totalPeepRequired: true,
  longestInspiratoryToExpiratory: 1 / 3,
} as const;

/** O2, table of section 4. */
export const startingSets = {
  "unit-default": { name: "unit default, no lung injury", targets: noInjury },
  ards: {
    name: "ARDS (ARDS Network)",
    targets: {
      ...noInjury,
      conditions: ["ards"],
      vtMlPerKg: { min: 4, max: 6.5, goal: 6 },
      spo2Percent: { min: 88, max: 95 },
      pao2MmHg: { min: 55, max: 80 },
      peepTable: "lower",
    },
  },
  asthma: {
    name: "asthma (obstructive)",
    targets: {
      ...obstructive,
      conditions: ["obstructive"],
      spo2Percent: { min: 93, max: 96 },
      respiratoryRate: { min: 6, max: 14 },
    },
  },
  copd: {
    name: "COPD (obstructive)",
    targets: {
      ...obstructive,
      conditions: ["obstructive", "copd"],
      spo2Percent: { min: 88, max: 92 },
      pao2MmHg: { min: 55, max: 80 },
      respiratoryRate: { min: 8, max: 14 },
    },
  },
  "raised-icp": {
    name: "raised intracranial pressure",
    targets: {
      ...sixToEight,
      conditions: ["raised-icp"],
      spo2Percent: { min: 94 },
      pao2MmHg: { min: 80, max: 120 },
      ph: { min: 7.35, max: 7.45 },
      paco2MmHg: { min: 35, max: 45 },
      proningOnlyAsCall: true,
    },
  },
  "after-cardiac-arrest": {
    name: "after cardiac arrest",
    targets: {
      ...sixToEight,
      conditions: ["after-cardiac-arrest"],
      spo2Percent: { min: 94, max: 98 },
      pao2MmHg: { min: 75, max: 100 },
      paco2MmHg: { min: 35, max: 45 },
    },
  },
  pregnancy: {
    name: "pregnancy",
    targets: {
      ...noInjury,
      conditions: ["pregnancy"],
      vtMlPerKg: { min: 4, max: 8 },
      spo2Percent: { min: 95 },
      pao2MmHg: { min: 70 },
      ph: { min: 7.35, max: 7.47 },
      paco2MmHg: { min: 28, max: 35 },
      callAbovePaco2MmHg: 45,
      peepTable: "lower",
    },
  },
  ecmo: {
    name: "ECMO",
    targets: {
      ...noInjury,
      conditions: ["ecmo"],
      vtMlPerKg: { max: 4 },
      plateauCmH2O: { max: 25 },
      drivingPressureCmH2O: { max: 14 },
      spo2Percent: { min: 85, max: 95 },
      pao2MmHg: { min: 55, max: 80 },
      respiratoryRate: { min: 5, max: 20 },
    },
  },
  "one-lung": {
    name: "one lung, very small or deformed chest",
    targets: {
      ...noInjury,
      conditions: ["one-lung"],
      vtMlPerKg: null,
      spo2Percent: null,
      pao2MmHg: null,
      ph: null,
      respiratoryRate: null,
    },
  },
} as const satisfies Record<string, StartingSet>;

export type StartingSetName = keyof typeof startingSets;

/** A set as targets: the unit's default where nobody has ordered, or the numbers that begin an order. */
export function targetsFromSet(set: StartingSetName, origin: Targets["origin"] = "default"): Targets {
  return { set, origin, ...startingSets[set].targets };
}
