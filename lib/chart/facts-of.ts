import type { EntryKind } from "@/lib/contracts";
import type { FactBase, Facts } from "@/lib/protocol";
import { bodyOf } from "./detail-tables";
import type { EpisodeFactRows, FactRow } from "./queries/load-facts";

/** Under which name the core takes the facts of each kind. */
const factsName = {
  settings: "settings",
  "settings-checks": "settingsChecks",
  mechanics: "mechanics",
  observations: "observations",
  heights: "heights",
} as const satisfies Record<EntryKind, keyof Facts>;

const utc = (instant: string) => new Date(instant).toISOString();

function factOf(kind: EntryKind, { id, chartedAt, recordedAt, author, place, row }: FactRow): FactBase {
  const kept = place && { place: { id: place.id, recordedAt: utc(place.recordedAt) } };
  return { ...bodyOf(kind, row), id, chartedAt: utc(chartedAt), recordedAt: utc(recordedAt), author, ...kept };
}

/** The facts of one episode, ascending, as the core takes them. */
export function factsOf(rows: readonly EpisodeFactRows[]): Facts {
  return Object.fromEntries(rows.map(({ kind, facts }) => [factsName[kind], facts.map((row) => factOf(kind, row))]));
}
