import { dayAndDate } from "./day-and-date";
import { millisecondsOf, type Instant } from "./instant";
import { timeOfDay } from "./time-of-day";

const dayMs = 24 * 60 * 60 * 1000;

/**
 * When something was or will be, in the unit's zone: the clock time alone while it can mean one moment only, with its
 * day from 24 h away on, so that a reading of the day before is never taken for today's.
 * @example clockTime({ at: "2026-12-01T10:19:00Z", now: "2026-12-01T16:45:00Z", timeZone: "Europe/London" }) //=> "10:19"
 * @example clockTime({ at: "2026-11-30T10:19:00Z", now: "2026-12-01T16:45:00Z", timeZone: "Europe/London" }) //=> "Mon 30 Nov 10:19"
 */
export function clockTime({ at, now, timeZone }: { at: Instant; now: Instant; timeZone: string }): string {
  const time = timeOfDay({ at, timeZone });
  return Math.abs(millisecondsOf(now) - millisecondsOf(at)) < dayMs ? time : `${dayAndDate({ at, timeZone })} ${time}`;
}
