import { Freshness } from "@/components/figures/freshness";
import { StateWord } from "@/components/figures/state-word";
import type { HistoryOf } from "@/components/history/history-of";
import type { Worksheet } from "@/lib/contracts";
import { ColumnHead } from "./column-head";
import { Judged } from "./judged";
import { measuredOf, type Measured } from "./measured-of";
import { gasRows, mechanicsRows, otherObservationRows, type MeasuredRow } from "./rows";
import { NotMeasured, SheetCell, SheetNumber } from "./sheet-cell";

interface MeasuredColumnProps {
  sheet: Worksheet;
  now: number;
  onHistory: (of: HistoryOf) => void;
}

/** What was read at the bedside: the number while it holds, else since when it no longer does. */
export function MeasuredColumn({ sheet, now, onHistory }: MeasuredColumnProps) {
  return (
    <section aria-label="Measured">
      <ColumnHead title="Measured" aside="age, or last value" />
      {shownRows(sheet).map((row) => (
        <MeasuredCell
          key={row.field}
          measured={measuredOf(sheet, row, now)}
          row={row}
          onHistory={historyOf(row, onHistory)}
        />
      ))}
    </section>
  );
}

/** A reading's history is that of its field; a gas is corrected as a whole, not here. */
function historyOf({ field, label, source }: MeasuredRow, open: (of: HistoryOf) => void) {
  return source === "bloodGas" ? undefined : () => open({ label, kind: source, field });
}

/** Gas rows come with the first gas; a reading that nobody takes here has no empty row. */
function shownRows(sheet: Worksheet): MeasuredRow[] {
  const others = otherObservationRows.filter(({ field }) => sheet.observations?.[field] !== undefined);
  return [...mechanicsRows, ...(sheet.bloodGas ? gasRows : []), ...others];
}

function MeasuredCell({
  measured,
  row,
  onHistory,
}: {
  measured: Measured;
  row: MeasuredRow;
  onHistory: (() => void) | undefined;
}) {
  const { text, judged, freshness, was } = measured;
  return (
    <SheetCell
      label={measured.label}
      aside={text === null ? was : <Freshness {...freshness} />}
      onOpen={measured.everCharted ? onHistory : undefined}
      opens={`history of ${row.label}`}
    >
      {text === null ? (
        <Stale measured={measured} />
      ) : (
        <>
          <SheetNumber text={text} unit={row.unit} />
          {judged?.state && <Judged {...judged} name={row.label} state={judged.state} widths={[60, 72]} />}
        </>
      )}
    </SheetCell>
  );
}

function Stale({ measured }: { measured: Measured }) {
  if (measured.notAsked) return <span className="t-body text-muted">not asked</span>;
  if (measured.lastOutsideAt) return <StateWord state="unmeasured" lastOutsideAt={measured.lastOutsideAt} />;
  if (measured.note) return <NotMeasured why={measured.note} />;
  return <Freshness {...measured.freshness} narrow />;
}
