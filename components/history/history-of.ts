import type { EntryKind } from "@/lib/contracts";

/** Which history to show: all of a kind, or of one field of it. */
export interface HistoryOf {
  label: string;
  kind: EntryKind;
  field?: string;
}
