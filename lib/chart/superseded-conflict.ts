import { AppError, type FieldConflict } from "@/lib/contracts";
import type { Transaction } from "sequelize";
import { bodyOf } from "./detail-tables";
import { loadEntries, type EntryRow } from "./queries/load-entries";

type Body = Record<string, unknown>;

/** Words and numbers pass through; a yes or no is written as a word. */
function shown(value: unknown): string | number | null {
  if (typeof value === "boolean") return value ? "yes" : "no";
  return typeof value === "number" || typeof value === "string" ? value : null;
}

function fieldConflicts({ yours, original, now }: { yours: Body; original: Body; now: EntryRow }): FieldConflict[] {
  const theirs = now.row ? bodyOf(now.kind, now.row) : {};
  const { id: entryId, chartedAt, author } = now;
  const fields = [...new Set([...Object.keys(yours), ...Object.keys(original), ...Object.keys(theirs)])];
  return fields.map((field) => ({
    field,
    yours: shown(yours[field]),
    basedOn: shown(original[field]),
    inForce: { value: shown(theirs[field]), entryId, chartedAt: chartedAt.toISOString(), author },
  }));
}

/** What stands in the place of a superseded entry, at the end of its chain. */
async function standingAfter(entry: EntryRow, episodeId: string, transaction: Transaction): Promise<EntryRow> {
  if (entry.supersededById === null) return entry;
  const [next] = await loadEntries({ episodeId, id: entry.supersededById }, transaction);
  return next ? standingAfter(next, episodeId, transaction) : entry;
}

/** An entry is superseded once: whoever comes second is shown both. */
export async function supersededConflict(
  original: EntryRow,
  { episodeId, yours = {}, transaction }: { episodeId: string; yours?: Body | undefined; transaction: Transaction },
): Promise<AppError> {
  const now = await standingAfter(original, episodeId, transaction);
  const did = now.correction === "void" ? "voided" : "corrected";
  return new AppError("conflict", `This entry was already ${did} by ${now.author.name}: look at both.`, {
    conflict: fieldConflicts({ yours, original: original.row ? bodyOf(original.kind, original.row) : {}, now }),
  });
}
