import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import { AppError, type EntriesAnswer, type Entry, type EntryKind } from "@/lib/contracts";
import { auditRead } from "./audit";
import { bodyOf, detailTables } from "./detail-tables";
import { loadEntries, type EntryFilter, type EntryRow } from "./queries/load-entries";

const PAGE = 50;

interface HistoryQuery {
  kind?: EntryKind | undefined;
  field?: string | undefined;
  before?: string | undefined;
}

/** When it was true, on the clock it was read from. */
function bedsideTime(chartedAt: Date, offsetMinutes: number): string {
  if (offsetMinutes === 0) return chartedAt.toISOString();
  const wallClock = new Date(chartedAt.getTime() + offsetMinutes * 60_000).toISOString().slice(0, -1);
  const [size, twoDigits] = [Math.abs(offsetMinutes), (part: number) => String(part).padStart(2, "0")];
  return `${wallClock}${offsetMinutes < 0 ? "-" : "+"}${twoDigits(Math.floor(size / 60))}:${twoDigits(size % 60)}`;
}

function entryOf(entry: EntryRow): Entry {
  const { row, offsetMinutes, ...rest } = entry;
  const body = row && bodyOf(entry.kind, row);
  return {
    ...rest,
    chartedAt: bedsideTime(entry.chartedAt, offsetMinutes),
    recordedAt: entry.recordedAt.toISOString(),
    body,
    reason: entry.reason ?? (typeof body?.reason === "string" ? body.reason : null),
  };
}

function refuse(path: string, message: string): never {
  throw new AppError("validation-failed", message, { errors: [{ path, message }] });
}

function columnOf(field: string | undefined): string | undefined {
  if (field === undefined) return undefined;
  const column = Object.values(detailTables)
    .find(({ columnOf }) => columnOf.has(field))
    ?.columnOf.get(field);
  return column ?? refuse("field", "No such field is charted.");
}

function cursorOf(before: string | undefined): EntryFilter["before"] {
  if (before === undefined) return undefined;
  if (/^\d{1,19}$/.test(before)) return { entryId: before };
  const at = new Date(before);
  return Number.isNaN(at.getTime()) ? refuse("before", "Neither a page of this history nor a time.") : { at };
}

/** Everything charted of an episode, newest first: what was corrected or voided stays readable, with who and why. */
export async function readEntries(
  ctx: Ctx,
  granted: GrantedPatient<"patients:read">,
  { kind, field, before }: HistoryQuery,
): Promise<EntriesAnswer> {
  const filter = {
    episodeId: granted.episodeId,
    kind,
    column: columnOf(field),
    before: cursorOf(before),
    limit: PAGE + 1,
  };
  const rows = await loadEntries(filter, ctx.transaction);
  await auditRead(ctx, granted, "entries.read");
  const page = rows.slice(0, PAGE);
  return { entries: page.map(entryOf), next: rows.length > PAGE ? (page.at(-1)?.id ?? null) : null };
}
