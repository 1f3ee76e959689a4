import type { Instant } from "./instant";
import { zonedParts } from "./zoned-parts";

/** Day and date in the unit's zone. @example dayAndDate({ at: "2026-12-01T16:45:00Z", timeZone: "Europe/London" }) //=> "Tue 1 Dec" */
export function dayAndDate({ at, timeZone }: { at: Instant; timeZone: string }): string {
  const { weekday, day, month } = zonedParts({ at, timeZone });
  return `${weekday} ${day} ${month}`;
}
