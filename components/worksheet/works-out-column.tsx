import { Freshness } from "@/components/figures/freshness";
import { StateWord } from "@/components/figures/state-word";
import { trackDomains, type TrackMetric } from "@/components/figures/track-domain";
import type { Derived, Worksheet } from "@/lib/contracts";
import { clockTime, displayNumber } from "@/lib/format";
import { arithmeticOf } from "./arithmetic";
import { ColumnHead } from "./column-head";
import { freshnessOf, lastOutsideTime } from "./freshness-of";
import { Judged } from "./judged";
import { noteWords, whyUnmeasured } from "./note-words";
import { derivedRows, gasDerivedRows, lastDerivedRows, type DerivedRow } from "./rows";
import { NotMeasured, SheetCell, SheetNumber } from "./sheet-cell";

interface WorksOutColumnProps {
  sheet: Worksheet;
  now: number;
  onWhereFrom: (row: DerivedRow) => void;
}

/** What the settings and readings come to, each with its sum; nothing worked out from a stale input is shown as true. */
export function WorksOutColumn({ sheet, now, onWhereFrom }: WorksOutColumnProps) {
  const clock = { now, timeZone: sheet.unit.timeZone };
  const rows = [...derivedRows, ...(sheet.bloodGas ? gasDerivedRows : []), ...lastDerivedRows];
  return (
    <section aria-label="Works out to">
      <ColumnHead title="Works out to" aside="how, or last value" />
      {rows.map((row) => {
        const derived = sheet.derived[row.name];
        if (!derived) return null;
        return (
          <DerivedCell
            key={row.name}
            row={row}
            derived={derived}
            clock={clock}
            pbwKg={sheet.pbwKg}
            onOpen={() => onWhereFrom(row)}
          />
        );
      })}
    </section>
  );
}

interface DerivedCellProps {
  row: DerivedRow;
  derived: Derived;
  clock: { now: number; timeZone: string };
  pbwKg: number | null;
  onOpen: () => void;
}

function DerivedCell({ row, derived, clock, pbwKg, onOpen }: DerivedCellProps) {
  const { value, state } = derived;
  const aside = value === null ? lastWords(row, derived, clock) : howWords(row, derived, pbwKg);
  return (
    <SheetCell label={row.label} aside={aside} onOpen={onOpen} opens={`where ${row.label} comes from`}>
      {value === null ? (
        <Unmeasured row={row} derived={derived} clock={clock} />
      ) : (
        <>
          <SheetNumber text={writeDerived(row, derived, value)} unit={unitWords(row, derived)} />
          {state && row.name in trackDomains && (
            <Judged {...derived} metric={row.name as TrackMetric} name={row.label} state={state} widths={[78, 104]} />
          )}
        </>
      )}
    </SheetCell>
  );
}

/** 'mL/kg', 'moderate'. */
function unitWords(row: DerivedRow, { unit, band }: Derived): string {
  return [unit === "mL" ? "mL" : row.unit, band].filter(Boolean).join(" ");
}

/** The sum, and on what it rests; what one row has said of the pressures below it is not said again. */
function howWords(row: DerivedRow, derived: Derived, pbwKg: number | null): string {
  const said = row.name === "drivingPressureCmH2O" || row.name === "vtMlPerKg";
  return [arithmeticOf(row.name, derived, pbwKg), said ? noteWords(derived.notes) : null].filter(Boolean).join(", ");
}

/** Decimals grow where rounding would hide on which side of a limit the value stands. */
export function writeDerived(row: DerivedRow, { limit }: Derived, value: number): string {
  const limits = [limit?.min, limit?.max].filter((each) => each !== undefined);
  return displayNumber({ value, decimals: row.decimals, limit: limits });
}

function lastWords(row: DerivedRow, derived: Derived, clock: DerivedCellProps["clock"]): string {
  if (derived.lastValue === null || !derived.chartedAt) return "";
  const last = writeDerived(row, derived, derived.lastValue);
  return `was ${last} at ${clockTime({ at: derived.chartedAt, ...clock })}`;
}

function Unmeasured({ row, derived, clock }: Pick<DerivedCellProps, "row" | "derived" | "clock">) {
  if (derived.state === "not-asked") return <span className="t-body text-muted">not asked</span>;
  const lastOutsideAt = lastOutsideTime(derived, clock);
  if (lastOutsideAt) return <StateWord state="unmeasured" lastOutsideAt={lastOutsideAt} />;
  const stale = derived.freshness === "changed-since" || derived.freshness === "lapsed";
  const why = stale ? null : (whyUnmeasured(derived.notes) ?? (derived.freshness === "missing" ? null : row.needs));
  if (why) return <NotMeasured why={why} />;
  return <Freshness {...freshnessOf(derived, clock, row.needs)} narrow />;
}
