import type { Instant } from "./instant";
import { offsetIso } from "./offset-iso";

/** The calendar date in the unit's zone. @example localDate({ at: "2026-12-01T23:30:00Z", timeZone: "Europe/Berlin" }) //=> "2026-12-02" */
export function localDate({ at, timeZone }: { at: Instant; timeZone: string }): string {
  return offsetIso({ at, timeZone }).slice(0, 10);
}
