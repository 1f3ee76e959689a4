import type { Instant } from "./facts";

/** Epoch milliseconds of a moment in any of the accepted forms. @throws RangeError when it is no moment */
export function millisecondsOf(instant: Instant): number {
  const ms = typeof instant === "number" ? instant : typeof instant === "string" ? Date.parse(instant) : +instant;
  if (Number.isNaN(ms))
    throw new RangeError(`not a moment: ${String(instant)}; allowed ISO 8601, milliseconds or Date`);
  return ms;
}

/** One answer names the same moments many times; writing a date out costs more than looking it up. */
const written = new Map<number, string>();
const keptMoments = 4096;

function write(ms: number): string {
  if (written.size >= keptMoments) written.clear();
  const iso = new Date(ms).toISOString();
  written.set(ms, iso);
  return iso;
}

/** ISO 8601 in UTC, or null where there is no moment. */
export function isoOf(ms: number | null | undefined): string | null {
  return ms === null || ms === undefined ? null : (written.get(ms) ?? write(ms));
}

export const minuteMs = 60_000;
export const hourMs = 60 * minuteMs;
