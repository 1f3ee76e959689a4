import { fio2FromInput, instantsOfWallTime, localDate, timeOfDay } from "@/lib/format";
import { lengthOfMethod, type Entry } from "@/lib/contracts";

/** The fields of an entry that a correction form edits as text. */
export function editableFields(entry: Entry): { field: string; text: string }[] {
  return Object.entries(withoutWorkedOutHeight(entry))
    .filter(([, value]) => typeof value === "number")
    .map(([field, value]) => ({ field, text: field === "fio2" ? Number(value).toFixed(2) : String(value) }));
}

/** A height estimated from a length is corrected by that length; the height is worked out from it again. */
function withoutWorkedOutHeight({ kind, body }: Entry): Record<string, unknown> {
  const estimated = kind === "heights" && String(body?.method) in lengthOfMethod;
  if (!estimated) return { ...body };
  const { heightCm: _workedOut, ...measured } = body ?? {};
  return measured;
}

/** Typed text as a number; a decimal comma counts as a point. */
function typedNumber(text: string): number {
  const trimmed = text.trim().replace(",", ".");
  return trimmed === "" ? Number.NaN : Number(trimmed);
}

/** What the corrected entry says: the old body with the typed numbers, an emptied field left out. */
export function correctedEntry(
  entry: Entry,
  typed: Record<string, string>,
  chartedAt: string,
): Record<string, unknown> {
  const body: Record<string, unknown> = { ...withoutWorkedOutHeight(entry), chartedAt };
  for (const { field } of editableFields(entry)) {
    const text = typed[field] ?? "";
    if (text.trim() === "") delete body[field];
    else body[field] = field === "fio2" ? fio2Of(text) : typedNumber(text);
  }
  return body;
}

function fio2Of(text: string): number {
  const taken = fio2FromInput(text);
  return "fraction" in taken ? taken.fraction : Number.NaN;
}

/** The moment for a corrected clock time on the entry's own date; the entry's moment where the clock is unchanged. */
export function correctedMoment(entry: Entry, time: string, timeZone: string): string | null {
  if (time === timeOfDay({ at: entry.chartedAt, timeZone })) return entry.chartedAt;
  if (!/^\d{2}:\d{2}$/.test(time)) return null;
  return instantsOfWallTime({ date: localDate({ at: entry.chartedAt, timeZone }), time, timeZone })[0] ?? null;
}
