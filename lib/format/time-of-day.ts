import type { Instant } from "./instant";
import { zonedParts } from "./zoned-parts";

/** Clock time in the unit's zone, 24 hours. @example timeOfDay({ at: "2026-12-01T14:20:00Z", timeZone: "Europe/London" }) //=> "14:20" */
export function timeOfDay({ at, timeZone }: { at: Instant; timeZone: string }): string {
  const { hour, minute } = zonedParts({ at, timeZone });
  return `${hour}:${minute}`;
}
