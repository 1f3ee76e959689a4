import { durationText } from "./duration-text";
import { millisecondsOf, type Instant } from "./instant";

/** The age of a reading. @example ageText({ since: "2026-12-01T14:35:00Z", at: "2026-12-01T16:45:00Z" }) //=> "2 h 10" */
export function ageText({ since, at }: { since: Instant; at: Instant }): string {
  return durationText({ minutes: (millisecondsOf(at) - millisecondsOf(since)) / 60_000 });
}
