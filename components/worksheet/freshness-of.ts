import type { FreshnessProps } from "@/components/figures/freshness";
import type { Derived } from "@/lib/contracts";
import { clockTime, durationText } from "@/lib/format";

/** What time and change have done to a reading; of a judged number or of a measured field alike. */
export type Reading = Pick<Derived, "freshness" | "changedAt" | "changedBy" | "dueAt" | "chartedAt">;

const changeWords = { settings: "change", turn: "turn", therapy: "therapy", event: "event" } as const;

/** The words' parts for a reading, at the unit's clock. `needs` names what a worked-out number waits for. */
export function freshnessOf(
  reading: Reading,
  clock: { now: number; timeZone: string },
  needs?: string,
): FreshnessProps {
  const { freshness, changedAt, changedBy, dueAt, chartedAt } = reading;
  const sinceAt = freshness === "due" ? dueAt : changedAt;
  return {
    freshness,
    changedBy: changeWords[changedBy ?? "settings"],
    ...(needs !== undefined && { needs }),
    ...(sinceAt && { since: clockTime({ at: sinceAt, ...clock }) }),
    ...(chartedAt && { age: durationText({ minutes: (clock.now - Date.parse(chartedAt)) / 60_000 }) }),
  };
}

/** 'HH:MM' of a value that was last outside and is not measured since (it stays told until a fresh one is inside). */
export function lastOutsideTime(
  { value, lastState, chartedAt }: Pick<Derived, "value" | "lastState" | "chartedAt">,
  clock: { now: number; timeZone: string },
): string | undefined {
  if (value !== null || lastState !== "outside" || chartedAt === null) return undefined;
  return clockTime({ at: chartedAt, ...clock });
}
