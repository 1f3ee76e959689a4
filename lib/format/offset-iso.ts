import { tzOffset } from "@date-fns/tz";
import { millisecondsOf, type Instant } from "./instant";

function offsetText(minutes: number): string {
  const twoDigits = (part: number) => String(part).padStart(2, "0");
  const size = Math.abs(minutes);
  return `${minutes < 0 ? "-" : "+"}${twoDigits(Math.floor(size / 60))}:${twoDigits(size % 60)}`;
}

/**
 * ISO 8601 with the offset that the zone had at that moment, to the second.
 * @throws RangeError for an unknown zone
 * @example offsetIso({ at: "2026-12-01T14:20:00Z", timeZone: "Europe/Berlin" }) //=> "2026-12-01T15:20:00+01:00"
 */
export function offsetIso({ at, timeZone }: { at: Instant; timeZone: string }): string {
  const milliseconds = millisecondsOf(at);
  const minutes = tzOffset(timeZone, new Date(milliseconds));
  if (Number.isNaN(minutes)) throw new RangeError(`unknown time zone: ${timeZone}`);
  const wallClock = new Date(milliseconds + minutes * 60_000).toISOString().slice(0, 19);
  return `${wallClock}${offsetText(minutes)}`;
}
