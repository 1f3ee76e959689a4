import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import { AppError, type ChartAnswer, type SubmissionVoidBody } from "@/lib/contracts";
import { chartAnswer } from "./chart-answer";
import { fileEntries, submissionOf } from "./file-entries";
import { loadEntries, type EntryRow } from "./queries/load-entries";
import { lockEpisode } from "./queries/lock-episode";
import { requireMayCorrect } from "./require-may-correct";

type Granted = GrantedPatient<"entries:correct">;

const stands = ({ correction, supersededById }: EntryRow) => correction !== "void" && supersededById === null;

async function entriesOf(ctx: Ctx, { episodeId }: Granted, submissionId: string): Promise<EntryRow[]> {
  const entries = await loadEntries({ episodeId, submissionId }, ctx.transaction);
  if (entries.length === 0) throw new AppError("not-found", "Nothing is found at this address.");
  return entries;
}

/** Before key and body are looked at: may this person void everything of it that still stands? */
export async function refuseVoid(ctx: Ctx, granted: Granted, submissionId: string): Promise<void> {
  for (const entry of (await entriesOf(ctx, granted, submissionId)).filter(stands)) requireMayCorrect(granted, entry);
}

/** Undo: voids every entry of a submission that has not been superseded. */
export async function voidSubmission(
  ctx: Ctx,
  granted: Granted,
  { submissionId, reason }: Omit<SubmissionVoidBody, "clientKey"> & { submissionId: string },
): Promise<ChartAnswer> {
  await lockEpisode(granted.episodeId, ctx.transaction);
  const standing = (await entriesOf(ctx, granted, submissionId)).filter(stands);
  if (standing.length === 0)
    throw new AppError("conflict", "Nothing of it is left to void: all of it was corrected or voided already.");
  for (const entry of standing) requireMayCorrect(granted, entry);
  const voids = standing.map(({ id, kind, chartedAt, offsetMinutes }) => ({
    kind,
    moment: { chartedAt, offsetMinutes },
    body: null,
    supersedes: { id, correction: "void" as const, reason },
  }));
  await fileEntries(ctx, granted, "chart.void-submission", voids);
  return chartAnswer(ctx, granted, submissionOf(ctx));
}
