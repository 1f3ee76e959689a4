import { ChartEntry } from "@/db/models";
import { canOf } from "@/lib/access/can-of";
import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient, PatientRow } from "@/lib/access/granted";
import type { ChartAnswer, EntryKind, Worksheet } from "@/lib/contracts";
import { readCase } from "./read-case";
import { worksheetOf } from "./worksheet-of";

/** Every right under which something is filed on an episode. */
export type ChartRight = `${EntryKind}:chart` | "bedside-entries:chart" | "entries:correct";

async function worksheetNow(ctx: Ctx, row: PatientRow): Promise<Worksheet> {
  return worksheetOf(await readCase(ctx, row, { at: ctx.now }), { bed: row.bed, can: canOf(row) });
}

/** What a submission filed, with the worksheet as it is now: the answer to its first sending and to every repeat. */
export async function chartAnswer(
  ctx: Ctx,
  granted: GrantedPatient<ChartRight>,
  submissionId: string,
): Promise<ChartAnswer> {
  const { transaction } = ctx;
  const where = { submissionId, episodeId: granted.episodeId };
  const filed = await ChartEntry.findAll({ attributes: ["id", "kind"], where, order: [["id", "ASC"]], transaction });
  return {
    submission: { id: submissionId },
    entries: filed.map(({ id, kind }) => ({ id, kind: kind as EntryKind })),
    worksheet: await worksheetNow(ctx, granted),
  };
}
