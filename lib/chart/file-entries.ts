import { ChartEntry, Height, MechanicsReading, Observation, SettingChange, SettingsCheck } from "@/db/models";
import type { Ctx } from "@/lib/access/context";
import type { PatientRow } from "@/lib/access/granted";
import type { EntryKind } from "@/lib/contracts";
import { auditChange } from "./audit";
import type { ChartedMoment } from "./charted-moment";
import { detailOf } from "./detail-tables";
import { announceChart } from "./queries/announce-chart";

/** What is filed of one kind: `body` is null in a void, which has no content of its own. */
export interface NewEntry {
  kind: EntryKind;
  moment: ChartedMoment;
  body: Record<string, unknown> | null;
  supersedes?: { id: string; correction: "replace" | "void"; reason: string };
}

export interface FiledEntry {
  id: string;
  kind: EntryKind;
}

const detailModels = {
  settings: SettingChange,
  "settings-checks": SettingsCheck,
  mechanics: MechanicsReading,
  observations: Observation,
  heights: Height,
};

export function submissionOf({ submissionId }: Ctx): string {
  if (submissionId === null) throw new Error("charting needs a submission");
  return submissionId;
}

async function fileEntry(
  ctx: Ctx,
  episodeId: string,
  { kind, moment, body, supersedes }: NewEntry,
): Promise<FiledEntry> {
  const { transaction, actor, now } = ctx;
  const { id } = await ChartEntry.create(
    {
      submissionId: submissionOf(ctx),
      episodeId,
      kind,
      chartedAt: moment.chartedAt,
      chartedOffsetMin: moment.offsetMinutes,
      recordedAt: now,
      authorId: actor.userId,
      supersedesId: supersedes?.id ?? null,
      correction: supersedes?.correction ?? null,
      reason: supersedes?.reason ?? null,
    },
    { transaction },
  );
  // One union of models has no common `create`: each takes its own kind's columns, which `detailOf` chose.
  const model = detailModels[kind] as typeof SettingsCheck;
  if (body) await model.create({ entryId: id, ...detailOf(kind, body) }, { transaction });
  return { id, kind };
}

/** Files one entry a kind under the request's submission, says who did it, and tells the screens that are open. */
export async function fileEntries(
  ctx: Ctx,
  row: PatientRow,
  action: string,
  entries: readonly NewEntry[],
): Promise<FiledEntry[]> {
  const filed: FiledEntry[] = [];
  for (const entry of entries) filed.push(await fileEntry(ctx, row.episodeId, entry));
  await auditChange(ctx, row, { action, newValues: { entries: filed } });
  await announceChart(row, ctx.transaction);
  return filed;
}
