import { ageText, instantsOfWallTime, localDate } from "@/lib/format";

const minuteMs = 60_000;
const dayMs = 24 * 60 * minuteMs;
/** The server takes this much ahead as its own now. */
const aheadMs = 5 * minuteMs;
const lateFromMs = 60 * minuteMs;

/**
 * The moments of the 24 h that end 5 min ahead, so that no clock time occurs twice by itself, at which the unit's clock showed this time: one as a rule, two where the clock was put
 * back, none where it was put forward.
 * @param time 'HH:MM'
 */
export function momentsOfTime({ time, now, timeZone }: { time: string; now: number; timeZone: string }): string[] {
  const dates = new Set([localDate({ at: now - dayMs, timeZone }), localDate({ at: now + aheadMs, timeZone })]);
  return [...dates]
    .flatMap((date) => instantsOfWallTime({ date, time, timeZone }))
    .filter((instant) => Date.parse(instant) > now + aheadMs - dayMs && Date.parse(instant) <= now + aheadMs);
}

/** Why an entry may not be charted at this time, or null. */
export function timeRefusal({ at, now, intubatedAt }: { at: string; now: number; intubatedAt: string }): string | null {
  const moment = Date.parse(at);
  if (now - moment > dayMs) return "The time is more than 24 h back: set a later one.";
  if (moment - now > aheadMs) return "The time is more than 5 min ahead: set an earlier one.";
  if (moment < Date.parse(intubatedAt)) return "The time is before intubation: charting starts there.";
  return null;
}

/** 'late by 2 h 10', from an hour on; null before. */
export function latenessOf(at: string, now: number): string | null {
  return now - Date.parse(at) >= lateFromMs ? `late by ${ageText({ since: at, at: now })}` : null;
}
