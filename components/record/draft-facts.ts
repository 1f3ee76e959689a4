import type { BedsideEntryBody } from "@/lib/contracts";
import type { FactBase, Facts } from "@/lib/protocol/facts";

/** Entry id of what a person is still typing. */
export const draftId = "draft";

const lastMoment = "9999-12-31T00:00:00Z";

type Charted = Pick<BedsideEntryBody, "chartedAt" | "settings" | "mechanics" | "observations">;

function inserted<Fact extends FactBase>(standing: readonly Fact[] | undefined, added: Fact): Fact[] {
  const after = new Date(added.chartedAt).getTime();
  const before = (standing ?? []).filter(({ chartedAt }) => new Date(chartedAt).getTime() <= after);
  return [...before, added, ...(standing ?? []).slice(before.length)];
}

/** The facts as they would stand with this entry charted, for the result shown while typing. */
export function withEntry(facts: Facts, entry: Charted): Facts {
  const base: FactBase = {
    id: draftId,
    chartedAt: entry.chartedAt,
    // Recorded after everything that stands, as it will be: of two entries of one moment the later recorded holds.
    recordedAt: lastMoment,
    author: { id: draftId, name: "" },
  };
  return {
    ...facts,
    ...(entry.settings && { settings: inserted(facts.settings, { ...base, ...entry.settings }) }),
    ...(entry.mechanics && { mechanics: inserted(facts.mechanics, { ...base, ...entry.mechanics }) }),
    ...(entry.observations && { observations: inserted(facts.observations, { ...base, ...entry.observations }) }),
  };
}
