import { LastCharted } from "@/components/history/last-charted";
import type { HistoryOf } from "@/components/history/history-of";
import type { Worksheet } from "@/lib/contracts";
import { dueInOrder, dueSentence } from "./due-words";

interface DueRailProps {
  sheet: Worksheet;
  now: number;
  onHistory: (of: HistoryOf) => void;
}

/** At 1440, beside the sheet: what is due, and what was charted last. */
export function DueRail({ sheet, now, onHistory }: DueRailProps) {
  const due = dueInOrder(sheet.due, now);
  return (
    <aside
      aria-label="Due, and charted last"
      className="w-[332px] shrink-0 border-l border-hair bg-surface px-6 pt-3 pb-12 max-desk:hidden"
    >
      <h2 className="t-label text-muted">Due</h2>
      {due.length === 0 && <p className="py-2 t-head">Nothing is due</p>}
      <ul>
        {due.map((each) => (
          <li key={each.what} className="py-2 t-body rule-row">
            <span className={each.overdue ? "font-[640] text-edge" : ""}>
              {dueSentence(each, now, sheet.unit.timeZone)}
            </span>
          </li>
        ))}
      </ul>
      <LastCharted sheet={sheet} onHistory={onHistory} />
    </aside>
  );
}
