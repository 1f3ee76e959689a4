import { Button } from "@/components/ui/button";
import { SideSheet } from "@/components/ui/side-sheet";
import type { Worksheet } from "@/lib/contracts";
import { useEntries } from "@/lib/client/use-entries";
import { calendarDate } from "@/lib/format";
import { EntryRow } from "./entry-row";
import type { HistoryOf } from "./history-of";

interface HistorySheetProps {
  sheet: Worksheet;
  of: HistoryOf | null;
  onClose: () => void;
}

/** Everything ever charted for a value, newest first; what was corrected or voided stays readable, struck through. */
export function HistorySheet({ sheet, of, onClose }: HistorySheetProps) {
  return (
    <SideSheet open={of !== null} onClose={onClose} title={of ? `History of ${of.label}` : ""}>
      <p className="t-small text-muted">
        {sheet.patient.name}, born {calendarDate(sheet.patient.birthDate)}, MRN {sheet.patient.mrn}
      </p>
      {of && <Entries sheet={sheet} of={of} />}
    </SideSheet>
  );
}

function Entries({ sheet, of }: { sheet: Worksheet; of: HistoryOf }) {
  const { data, isPending, isError, refetch, hasNextPage, fetchNextPage, isFetchingNextPage } = useEntries({
    patientId: sheet.patient.id,
    filter: { kind: of.kind, ...(of.field && { field: of.field }) },
  });
  const entries = data?.pages.flatMap((page) => page.entries) ?? [];
  if (isPending) return <p className="py-4 t-body text-muted">Loading the history…</p>;
  return (
    <>
      {isError && (
        <p role="alert" className="py-3 t-body">
          The history could not be loaded.{" "}
          <button type="button" className="font-[640] text-accent underline" onClick={() => void refetch()}>
            Try again
          </button>
        </p>
      )}
      {entries.length === 0 && !isError && <p className="py-4 t-body text-muted">Nothing has been charted yet.</p>}
      <ol>
        {entries.map((entry) => (
          <EntryRow
            key={entry.id}
            entry={entry}
            sheet={sheet}
            supersededBy={entries.find(({ supersedesId }) => supersedesId === entry.id)}
          />
        ))}
      </ol>
      {hasNextPage && (
        <Button className="mt-3 w-full" disabled={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          Show older
        </Button>
      )}
    </>
  );
}
