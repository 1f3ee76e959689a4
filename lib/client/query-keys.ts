import type { EntryKind } from "@/lib/contracts";

export interface EntriesFilter {
  kind?: EntryKind;
  field?: string;
}

/** Every query key, from the widest to the narrowest, so that a prefix drops all below it. */
export const queryKeys = {
  me: () => ["me"] as const,
  unit: (unitId: string) => ["units", unitId] as const,
  beds: (unitId: string) => ["units", unitId, "beds"] as const,
  patient: (patientId: string) => ["patients", patientId] as const,
  worksheet: (patientId: string) => ["patients", patientId, "worksheet"] as const,
  /** The worksheet with the facts that the form's live result needs. */
  worksheetWithFacts: (patientId: string) => ["patients", patientId, "worksheet-with-facts"] as const,
  allEntries: (patientId: string) => ["patients", patientId, "entries"] as const,
  entries: (patientId: string, filter: EntriesFilter) => ["patients", patientId, "entries", filter] as const,
};
