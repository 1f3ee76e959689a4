import type { Ctx } from "@/lib/access/context";
import type { GrantedUnit } from "@/lib/access/granted";
import type { BedRow, BedsAnswer } from "@/lib/contracts";
import { compareBeds, type DerivedName, type Evaluation } from "@/lib/protocol";
import { auditRead } from "./audit";
import { factsOf } from "./facts-of";
import { settingsValues } from "./newest-values";
import { loadBeds, type BedWithEpisode } from "./queries/load-beds";
import { loadEpisodes } from "./queries/load-episodes";
import { loadFactRows } from "./queries/load-facts";
import { loadUnit, type UnitWithPolicy } from "./queries/load-unit";
import { targetsOf, type Case } from "./read-case";
import { evaluationOf, patientOf, pausedSince, unitShown, ventilationDay } from "./worksheet-of";

/** The numbers that a row of Beds shows or names as its cause. */
const shownOnBeds: readonly DerivedName[] = [
  "vtMlPerKg",
  "plateauCmH2O",
  "drivingPressureCmH2O",
  "intrinsicPeepCmH2O",
  "pfRatio",
  "sfRatio",
  "spo2Percent",
  "pao2MmHg",
  "paco2MmHg",
  "ph",
];

interface JudgedBed {
  row: BedRow;
  /** Null in a free bed. */
  evaluation: Evaluation | null;
}

const groups = { outside: 0, unmeasured: 0, edge: 0, inside: 0, "not-judged": 0, away: 0, free: 0 };

function initialsOf(name: string): string {
  const parts = name.split(/\s+/).filter(Boolean);
  return [parts.at(0), parts.length > 1 ? parts.at(-1) : undefined]
    .map((part) => part && `${part[0]?.toUpperCase()}.`)
    .join("");
}

function freeBed({ id, label }: BedWithEpisode): JudgedBed {
  const nothing = { patient: null, episode: null, state: null, settings: null, nextStep: null };
  return { row: { bed: { id, label }, ...nothing, cause: [], derived: {}, due: [] }, evaluation: null };
}

function judgedBed({ id, label }: BedWithEpisode, patientCase: Case): JudgedBed {
  const evaluation = evaluationOf(patientCase);
  const patient = patientOf(patientCase);
  const settings = settingsValues(patientCase.facts, patientCase.at);
  const row: BedRow = {
    bed: { id, label },
    patient: { ...patient, initials: initialsOf(patient.name) },
    episode: {
      id: patientCase.episode.episodeId,
      day: ventilationDay(patientCase),
      pausedSince: pausedSince(patientCase.episode),
    },
    state: evaluation.group,
    cause: evaluation.causes,
    settings,
    derived: Object.fromEntries(shownOnBeds.map((name) => [name, evaluation.derived[name]])),
    due: evaluation.due,
    nextStep: evaluation.nextSteps[0] ?? null,
  };
  return { row, evaluation };
}

/** The cases of a unit's patients, by episode, all of them from the same two statements. */
async function casesOf(
  { transaction, now: at }: Ctx,
  unit: UnitWithPolicy,
  episodeIds: string[],
): Promise<Map<string, Case>> {
  const episodes = await loadEpisodes({ episodeIds, at }, transaction);
  const rows = await loadFactRows({ episodeIds, at }, transaction);
  return new Map(
    episodes.map((episode) => {
      const facts = factsOf(rows.filter(({ episodeId }) => episodeId === episode.episodeId));
      return [episode.episodeId, { at, unit, episode, targets: targetsOf(unit, episode.order), facts }];
    }),
  );
}

/** Rules S4; free beds last. */
function lookFirst({ evaluation: one }: JudgedBed, { evaluation: other }: JudgedBed): number {
  if (one && other) return compareBeds(one, other);
  return Number(one === null) - Number(other === null);
}

function countsOf(beds: readonly JudgedBed[]): Record<string, number> {
  const counts = { ...groups };
  for (const { row } of beds) counts[row.state ?? "free"] += 1;
  return counts;
}

/** Every bed of the unit, what needs a look first at the top; free beds last. */
export async function readBeds(ctx: Ctx, granted: GrantedUnit<"beds:read">): Promise<BedsAnswer> {
  const unit = await loadUnit({ unitId: granted.unitId, at: ctx.now }, ctx.transaction);
  const beds = await loadBeds(granted.unitId, ctx.transaction);
  const cases = await casesOf(
    ctx,
    unit,
    beds.flatMap(({ episodeId }) => episodeId ?? []),
  );
  await auditRead(ctx, granted, "beds.read");
  const judged = beds
    .map((bed) => {
      const patientCase = cases.get(bed.episodeId ?? "");
      return patientCase ? judgedBed(bed, patientCase) : freeBed(bed);
    })
    .sort(lookFirst);
  const until = judged.flatMap(({ evaluation }) => evaluation?.validUntil ?? []).sort();
  return {
    unit: unitShown(unit),
    at: ctx.now.toISOString(),
    validUntil: until[0] ?? null,
    counts: countsOf(judged),
    rows: judged.map(({ row }) => row),
  };
}
