import { Subscripted } from "@/components/figures/subscripted";
import { SideSheet } from "@/components/ui/side-sheet";
import type { Derived, Worksheet } from "@/lib/contracts";
import { dayAndDate, durationText, timeOfDay } from "@/lib/format";
import { arithmeticOf } from "./arithmetic";
import { inputWords } from "./input-words";
import type { DerivedRow } from "./rows";
import { writeDerived } from "./works-out-column";

interface WhereFromProps {
  sheet: Worksheet;
  row: DerivedRow | null;
  now: number;
  onClose: () => void;
}

/** Where a number comes from: its sum with this patient's values, each input's time, author and age, and the source. */
export function WhereFrom({ sheet, row, now, onClose }: WhereFromProps) {
  const derived = row ? sheet.derived[row.name] : undefined;
  return (
    <SideSheet open={row !== null} onClose={onClose} title={row ? `${row.label}: where from` : ""}>
      {row && derived && <Explained row={row} derived={derived} now={now} sheet={sheet} />}
    </SideSheet>
  );
}

function Explained({ row, derived, now, sheet }: { row: DerivedRow; derived: Derived; now: number; sheet: Worksheet }) {
  const { pbwKg } = sheet;
  const { timeZone } = sheet.unit;
  const shown = derived.value ?? derived.lastValue;
  return (
    <div className="space-y-4">
      {shown !== null && (
        <p className="t-head">
          <Subscripted
            text={`${arithmeticOf(row.name, derived, pbwKg)} = ${writeDerived(row, derived, shown)} ${row.unit}`}
          />
        </p>
      )}
      {derived.value === null && shown !== null && (
        <p className="t-body text-unm">No longer current: this is the last value.</p>
      )}
      <table className="w-full t-small">
        <thead>
          <tr className="text-left rule-head">
            <th className="py-1 font-[640]">From</th>
            <th className="py-1 font-[640]">Charted</th>
            <th className="py-1 text-right font-[640]">Age</th>
          </tr>
        </thead>
        <tbody>
          {derived.inputs.map((input) => (
            <tr key={input.name} className="align-top rule-row">
              <td className="py-1.5">
                <Subscripted text={inputWords(input.name, input.value)} />
              </td>
              <td className="py-1.5">
                {input.chartedAt &&
                  `${dayAndDate({ at: input.chartedAt, timeZone })} ${timeOfDay({ at: input.chartedAt, timeZone })}`}
                {input.author && <span className="block text-muted">{input.author.name}</span>}
              </td>
              <td className="py-1.5 text-right">
                {input.chartedAt && durationText({ minutes: (now - Date.parse(input.chartedAt)) / 60_000 })}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {derived.inputs.length === 0 && (
        <p className="t-body text-muted">Nothing has been charted that it could come from.</p>
      )}
      <p className="t-small text-muted">{derived.source}</p>
    </div>
  );
}
