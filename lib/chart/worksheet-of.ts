import { localDate } from "@/lib/format";
import type { Worksheet } from "@/lib/contracts";
import { evaluate, pbwOf, policyOf, type Evaluation, type Facts } from "@/lib/protocol";
import { ageInYears } from "./age-in-years";
import { newestValues, originOf, settingsValues } from "./newest-values";
import type { Case } from "./read-case";

const DAY_MS = 86_400_000;

/** What `evaluate` says of a case at a moment. */
export function evaluationOf({ at, unit, episode, targets, facts }: Case): Evaluation {
  const { intubatedAt, endedAt, pauses } = episode;
  return evaluate({ targets, unit, episode: { intubatedAt, endedAt, pauses }, facts, at });
}

/** Day of ventilation by the unit's calendar: the day of intubation is day 1. */
export function ventilationDay({ at, unit: { timeZone }, episode }: Case): number {
  const dayOf = (moment: Date) => Date.parse(localDate({ at: moment, timeZone }));
  return Math.max(1, Math.round((dayOf(at) - dayOf(episode.intubatedAt)) / DAY_MS) + 1);
}

export function patientOf({ at, unit, episode }: Case): Worksheet["patient"] {
  const { patientId: id, name, birthDate, mrn } = episode;
  return {
    id,
    name,
    birthDate,
    mrn,
    ageYears: ageInYears({ birthDate, onDate: localDate({ at, timeZone: unit.timeZone }) }),
  };
}

export function pausedSince({ pauses }: Case["episode"]): string | null {
  const open = pauses.find(({ until }) => until === null);
  return open ? new Date(open.from).toISOString() : null;
}

function episodeOf(patientCase: Case, bed: Worksheet["episode"]["bed"]): Worksheet["episode"] {
  const { episode } = patientCase;
  const { episodeId: id, intubatedAt, endedAt, pauses } = episode;
  const utc = (instant: string) => new Date(instant).toISOString();
  return {
    id,
    intubatedAt: intubatedAt.toISOString(),
    day: ventilationDay(patientCase),
    bed,
    pausedSince: pausedSince(episode),
    endedAt: endedAt?.toISOString() ?? null,
    pauses: pauses.map(({ from, until }) => ({ from: utc(from), until: until && utc(until) })),
  };
}

function heightOf(facts: Facts): Worksheet["height"] {
  const height = facts.heights?.at(-1);
  if (!height || height.heightCm == null) return null;
  const { heightCm, method, sexForPbw = null } = height;
  return { heightCm, method, sexForPbw, ...originOf(height) };
}

function targetsShown({ targets, episode }: Case): Worksheet["targets"] {
  const { set, recordedAt, origin, conditions = [], peepTable = "none" } = targets;
  const range = <Limit>(limit: Limit | null | undefined) => limit ?? null;
  return {
    ...(set && { set }),
    ...(recordedAt && { recordedAt: String(recordedAt) }),
    origin,
    conditions: [...conditions],
    vtMlPerKg: range(targets.vtMlPerKg),
    vtMl: range(targets.vtMl),
    plateauCmH2O: range(targets.plateauCmH2O),
    drivingPressureCmH2O: range(targets.drivingPressureCmH2O),
    spo2Percent: range(targets.spo2Percent),
    pao2MmHg: range(targets.pao2MmHg),
    ph: range(targets.ph),
    paco2MmHg: range(targets.paco2MmHg),
    respiratoryRate: range(targets.respiratoryRate),
    peepTable,
    orderedBy: episode.order?.author ?? null,
  };
}

/** The unit with its policy's gaps filled by the starting values. */
export function unitShown(unit: Case["unit"]): Worksheet["unit"] {
  const { defaultTargets: _targets, ...shown } = unit;
  const { intervals, steps } = policyOf(unit);
  return { ...shown, intervals: { ...intervals }, steps: { ...steps } };
}

/** What was charted and what follows from it, at one moment. */
export function worksheetOf(
  patientCase: Case,
  { bed, can }: { bed: Worksheet["episode"]["bed"]; can: Worksheet["can"] },
): Worksheet {
  const { at, unit, facts } = patientCase;
  const check = facts.settingsChecks?.at(-1);
  const pbw = pbwOf(facts, at);
  return {
    patient: patientOf(patientCase),
    episode: episodeOf(patientCase, bed),
    height: heightOf(facts),
    pbwKg: pbw.pbwKg,
    pbwAlternatives: pbw.alternatives,
    targets: targetsShown(patientCase),
    unit: unitShown(unit),
    settings: settingsValues(facts, at),
    settingsCheckedAt: check ? { value: String(check.chartedAt), ...originOf(check) } : null,
    mechanics: newestValues(facts.mechanics),
    observations: newestValues(facts.observations),
    bloodGas: null,
    position: null,
    ...evaluationOf(patientCase),
    at: at.toISOString(),
    can,
  };
}
