import type { RecordDraft } from "./record-draft";
import type { Pending } from "./pending-facts";
import type { RecordEditing } from "./use-record-values";

interface Kept {
  editing: RecordEditing;
  clientKey: string;
  bedId: string | null;
  pending: Pending | null;
}

/** What must be kept on the device now: typed work, an entry on its way, or nothing. */
export function draftOf({ editing, clientKey, bedId, pending }: Kept): RecordDraft | null {
  const sending = pending && pending.submissionId === null ? pending : null;
  if (!editing.begun && !sending) return null;
  return {
    version: 1,
    values: editing.values,
    filled: editing.begun ? editing.filled : null,
    clientKey,
    bedId,
    sending: sending && { entry: sending.entry, values: sending.values, filled: sending.filled },
  };
}
