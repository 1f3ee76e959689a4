import { offsetIso } from "@/lib/format";
import type { Facts } from "@/lib/protocol/facts";
import { settingsInForce } from "@/lib/protocol/settings-in-force";
import type { Filled } from "./filled";

/** The form as it stands before anything is put in: the settings that were in force at its time. */
export function fillForm({ facts, at, timeZone }: { facts: Facts; at: number | string; timeZone: string }): Filled {
  const chartedAt = offsetIso({ at, timeZone });
  const { mode, ...inForce } = settingsInForce({ changes: facts.settings, at: chartedAt });
  const values = Object.entries(inForce).map(([field, held]) => [field, held?.value ?? null]);
  return { chartedAt, values: { ...Object.fromEntries(values), mode: mode?.value ?? null } };
}

/** Settings in force at the form's time that are no longer what the form shows: somebody charted meanwhile. */
export function movedSince(filled: Filled, now: Filled): string[] {
  const fields = new Set([...Object.keys(filled.values), ...Object.keys(now.values)]);
  return [...fields].filter((field) => (filled.values[field] ?? null) !== (now.values[field] ?? null));
}
