import { AppError } from "@/lib/contracts";

const MINUTE_MS = 60_000;
/** A device clock may run this far ahead of the server's; then the server's now is stored. */
const AHEAD_MS = 5 * MINUTE_MS;
/** How far back something new may be charted. */
const BACK_MS = 24 * 60 * MINUTE_MS;

/** When something was true at the bedside, with the offset of the clock it was read from. */
export interface ChartedMoment {
  chartedAt: Date;
  offsetMinutes: number;
}

function offsetMinutesOf(instant: string): number {
  const [, sign, hours, minutes] = /([+-])(\d{2}):?(\d{2})$/.exec(instant) ?? [];
  if (!sign) return 0;
  return (sign === "-" ? -1 : 1) * (Number(hours) * 60 + Number(minutes));
}

function refuse(path: string, message: string): never {
  throw new AppError("validation-failed", message, { errors: [{ path, message }] });
}

/**
 * Reads `chartedAt` against the server's clock and the episode: at most 24 h back (unless it repeats `keeps`, the time of
 * the entry it replaces), never before intubation, up to 5 min ahead stored as now.
 */
export function chartedMoment(
  instant: string,
  { now, intubatedAt, keeps, path = "chartedAt" }: { now: Date; intubatedAt: Date; keeps?: Date; path?: string },
): ChartedMoment {
  const asked = Date.parse(instant);
  if (Number.isNaN(asked)) refuse(path, "That time does not exist: enter a date, a time and its offset.");
  if (asked - now.getTime() > AHEAD_MS)
    refuse(path, "The time is more than 5 min ahead of the server: check the clock of this device.");
  const kept = keeps?.getTime() === asked;
  if (!kept && now.getTime() - asked > BACK_MS)
    refuse(path, "The time is more than 24 h back: what is older goes into a note.");
  if (asked < intubatedAt.getTime()) refuse(path, "The time is before intubation: charting starts there.");
  return { chartedAt: new Date(Math.min(asked, now.getTime())), offsetMinutes: offsetMinutesOf(instant) };
}

/** The date on the bedside clock. */
export function bedsideDate({ chartedAt, offsetMinutes }: ChartedMoment): string {
  return new Date(chartedAt.getTime() + offsetMinutes * MINUTE_MS).toISOString().slice(0, 10);
}
