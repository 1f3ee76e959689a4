import type { SettingsValues } from "@/lib/contracts";
import type { Facts } from "@/lib/protocol/facts";
import { settingsInForce, type ValueInForce } from "@/lib/protocol/settings-in-force";
import { withEntry } from "./draft-facts";

export interface LateEffect {
  /** Settings that are in force now and that this entry would replace. */
  altersNow: string[];
  /** Settings that were charted again since: those stay. */
  staysNow: { field: string; value: number | string }[];
}

const valueNow = (inForce: ReturnType<typeof settingsInForce>, field: string): number | string | null =>
  (inForce as Record<string, ValueInForce<number | string> | null | undefined>)[field]?.value ?? null;

/** What an entry for an earlier time does to the settings in force now: a person is told before saving. */
export function lateEffect(input: {
  facts: Facts;
  chartedAt: string;
  settings: SettingsValues;
  now: number;
}): LateEffect {
  const { facts, chartedAt, settings, now } = input;
  const before = settingsInForce({ changes: facts.settings, at: now });
  const after = settingsInForce({ changes: withEntry(facts, { chartedAt, settings }).settings, at: now });
  const fields = Object.keys(settings);
  return {
    altersNow: fields.filter((field) => valueNow(before, field) !== valueNow(after, field)),
    staysNow: fields.flatMap((field) => {
      const value = valueNow(after, field);
      const mine = (settings as Record<string, unknown>)[field];
      return value !== null && value !== mine ? [{ field, value }] : [];
    }),
  };
}
