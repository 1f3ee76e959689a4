import { Subscripted } from "@/components/figures/subscripted";
import type { EntryKind, Worksheet } from "@/lib/contracts";
import { useEntries } from "@/lib/client/use-entries";
import { clockTime } from "@/lib/format";
import { entryWords } from "./entry-words";
import type { HistoryOf } from "./history-of";

const kindLabels: Record<EntryKind, string> = {
  settings: "settings",
  "settings-checks": "settings checks",
  mechanics: "measurements",
  observations: "observations",
  heights: "height",
};

const shownEntries = 6;

/** The newest entries of every kind; each opens its history, where it can be corrected. */
export function LastCharted({ sheet, onHistory }: { sheet: Worksheet; onHistory: (of: HistoryOf) => void }) {
  const { data, isPending } = useEntries({ patientId: sheet.patient.id, filter: {} });
  const entries = data?.pages[0]?.entries.slice(0, shownEntries) ?? [];
  return (
    <section aria-label="Charted last" className="pt-6">
      <h2 className="t-label text-muted">Charted last</h2>
      {isPending && <p className="py-2 t-small text-muted">Loading…</p>}
      {!isPending && entries.length === 0 && <p className="py-2 t-small text-muted">Nothing has been charted yet.</p>}
      <ol>
        {entries.map((entry) => (
          <li key={entry.id}>
            <button
              type="button"
              aria-haspopup="dialog"
              className="w-full py-2 text-left rule-row hover:bg-paper"
              onClick={() => onHistory({ label: kindLabels[entry.kind], kind: entry.kind })}
            >
              <span className="block t-label text-muted">
                {clockTime({ at: entry.chartedAt, now: sheet.at, timeZone: sheet.unit.timeZone })}, {entry.author.name}
              </span>
              <span className={`block t-small ${entry.supersededById ? "text-muted line-through" : ""}`}>
                <Subscripted text={entryWords(entry)} />
              </span>
            </button>
          </li>
        ))}
      </ol>
    </section>
  );
}
