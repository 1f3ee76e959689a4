import { emptyRecord, type RecordValues } from "@/components/record/record-values";
import type { Filled } from "@/components/record/filled";
import { settingsCharted } from "../../component/record/build-worksheet";

/** The form as opened at 14:20 over the settings of the test patient. */
export const filled: Filled = { chartedAt: "2026-12-01T14:20:10+01:00", values: { ...settingsCharted } };

export const nothingInForce: Filled = { chartedAt: filled.chartedAt, values: { mode: null } };

export function buildValues(overrides: Partial<RecordValues> = {}): RecordValues {
  return { ...emptyRecord, ...overrides };
}
