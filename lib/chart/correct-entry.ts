import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import { AppError, type ChartAnswer, type CorrectionBody } from "@/lib/contracts";
import { chartAnswer } from "./chart-answer";
import { fileEntries, submissionOf } from "./file-entries";
import { loadEntries, type EntryRow } from "./queries/load-entries";
import { lockEpisode } from "./queries/lock-episode";
import { replacementOf } from "./replacement-of";
import { requireMayCorrect } from "./require-may-correct";
import { supersededConflict } from "./superseded-conflict";

type Granted = GrantedPatient<"entries:correct">;

async function entryOf(ctx: Ctx, { episodeId }: Granted, id: string): Promise<EntryRow> {
  const [entry] = await loadEntries({ episodeId, id }, ctx.transaction);
  if (!entry) throw new AppError("not-found", "Nothing is found at this address.");
  return entry;
}

/** Before key and body are looked at: may this person correct that entry, and chart what stands instead? */
export async function refuseCorrection(ctx: Ctx, granted: Granted, entryId: string, json: unknown): Promise<void> {
  const replacement = (json as { entry?: unknown } | null)?.entry;
  requireMayCorrect(granted, await entryOf(ctx, granted, entryId), replacement);
}

async function refuseSuperseded(
  ctx: Ctx,
  { episodeId }: Granted,
  original: EntryRow,
  body: CorrectionBody,
): Promise<void> {
  if (original.correction === "void")
    throw new AppError("conflict", "A void is final: to bring the reading back, chart it anew.");
  if (original.supersededById === null) return;
  const { chartedAt: _at, ...yours } = body.entry ?? {};
  throw await supersededConflict(original, { episodeId, yours, transaction: ctx.transaction });
}

/** Replaces or voids one entry, which stays readable; the second who tries is shown both. */
export async function correctEntry(
  ctx: Ctx,
  granted: Granted,
  { entryId, ...body }: CorrectionBody & { entryId: string },
): Promise<ChartAnswer> {
  const { intubatedAt } = await lockEpisode(granted.episodeId, ctx.transaction);
  const original = await entryOf(ctx, granted, entryId);
  requireMayCorrect(granted, original, body.entry);
  await refuseSuperseded(ctx, granted, original, body);
  const { kind, chartedAt, offsetMinutes } = original;
  const { correction, reason, entry } = body;
  const filed =
    correction === "void"
      ? { moment: { chartedAt, offsetMinutes }, body: null }
      : await replacementOf(ctx, granted, { original, entry, intubatedAt });
  await fileEntries(ctx, granted, `chart.${correction}`, [
    { kind, ...filed, supersedes: { id: original.id, correction, reason } },
  ]);
  return chartAnswer(ctx, granted, submissionOf(ctx));
}
