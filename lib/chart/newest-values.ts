import type { Value } from "@/lib/contracts";
import { settingsInForce, type FactBase, type Facts } from "@/lib/protocol";

const own = new Set(["id", "chartedAt", "recordedAt", "author", "place"]);

function valueOf(value: Value["value"], { id, chartedAt, recordedAt, author }: FactBase): Value {
  return { value, entryId: id, chartedAt: String(chartedAt), recordedAt: String(recordedAt), author };
}

/** Times and author of a fact, as every answer carries them. */
export function originOf(fact: FactBase): Omit<Value, "value"> {
  const { value: _value, ...origin } = valueOf("", fact);
  return origin;
}

/** The newest value of each field, each with its own entry (rules V3); null when nothing was charted. */
export function newestValues(facts: readonly FactBase[] | undefined): Record<string, Value> | null {
  const newest: Record<string, Value> = {};
  for (const fact of facts ?? []) {
    for (const [field, value] of Object.entries(fact)) {
      if (!own.has(field) && value !== null && value !== undefined) newest[field] = valueOf(value, fact);
    }
  }
  return Object.keys(newest).length > 0 ? newest : null;
}

/** The settings in force, each with the entry it came from; null when none are. */
export function settingsValues(facts: Facts, at: Date): Record<string, Value> | null {
  const { mode, ...fields } = settingsInForce({ changes: facts.settings, at });
  return mode ? { mode, ...fields } : null;
}
