import { tzOffset } from "@date-fns/tz";
import { offsetIso } from "./offset-iso";

const dayMs = 24 * 60 * 60 * 1000;

function wallTimeAsUtc(date: string, time: string): number {
  const asUtc = new Date(`${date}T${time}:00Z`);
  const real =
    /^\d{4}-\d{2}-\d{2} \d{2}:\d{2}$/.test(`${date} ${time}`) &&
    !Number.isNaN(asUtc.getTime()) &&
    asUtc.toISOString().startsWith(`${date}T${time}`);
  if (!real) throw new RangeError(`not a date and time: ${date} ${time}; allowed YYYY-MM-DD and HH:MM`);
  return asUtc.getTime();
}

/**
 * Every moment at which the unit's clock showed this date and time, earliest first, as ISO 8601 with offset: one as a
 * rule, two in the hour that a clock change repeats, none in the hour that it skips.
 * @throws RangeError for what is no date or time, or an unknown zone
 * @example instantsOfWallTime({ date: "2026-12-01", time: "14:20", timeZone: "Europe/Berlin" }) //=> ["2026-12-01T14:20:00+01:00"]
 */
export function instantsOfWallTime(wall: { date: string; time: string; timeZone: string }): string[] {
  const { date, time, timeZone } = wall;
  const asUtc = wallTimeAsUtc(date, time);
  const offsetAt = (milliseconds: number) => tzOffset(timeZone, new Date(milliseconds));
  const offsets = new Set([offsetAt(asUtc - dayMs), offsetAt(asUtc + dayMs)]);
  return [...offsets]
    .map((minutes) => ({ minutes, instant: asUtc - minutes * 60_000 }))
    .filter(({ minutes, instant }) => Number.isNaN(minutes) || offsetAt(instant) === minutes)
    .sort((a, b) => a.instant - b.instant)
    .map(({ instant }) => offsetIso({ at: instant, timeZone }));
}
