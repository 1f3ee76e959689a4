import { zonedParts } from "./zoned-parts";

/**
 * A date without a time ('YYYY-MM-DD', such as a birth date) in words; no zone can shift it to the day before.
 * @throws RangeError for what is no calendar date
 * @example calendarDate("1968-03-12") //=> "12 Mar 1968"
 */
export function calendarDate(date: string): string {
  const noon = new Date(`${date}T12:00:00Z`);
  const real = /^\d{4}-\d{2}-\d{2}$/.test(date) && !Number.isNaN(noon.getTime()) && noon.toISOString().startsWith(date);
  if (!real) throw new RangeError(`not a calendar date: ${date}; allowed YYYY-MM-DD`);
  const { day, month, year } = zonedParts({ at: noon, timeZone: "UTC" });
  return `${day} ${month} ${year}`;
}
