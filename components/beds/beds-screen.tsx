"use client";

import Link from "next/link";
import { PressureSpanMini } from "@/components/figures/pressure-span-mini";
import { Quantity } from "@/components/figures/quantity";
import { TradeText } from "@/components/figures/trade-text";
import { Subscripted } from "@/components/figures/subscripted";
import { useBeds } from "@/lib/client/use-beds";
import { useServerNow } from "@/lib/client/server-clock";
import type { BedRow, BedsAnswer } from "@/lib/contracts";
import { displayNumber } from "@/lib/format";
import { modeLabel, ventilationModes } from "@/lib/physiology";
import { dueInOrder, dueSentence } from "@/components/worksheet/due-words";
import { spanOf } from "@/components/worksheet/span-of";
import { NotRefreshed } from "@/components/shell/not-refreshed";
import { causeWords } from "./cause-words";
import { GroupWord } from "./group-word";

/** The beds of a unit, what needs a look first at the top; each leads to its patient's worksheet. */
export function BedsScreen({ initial }: { initial: BedsAnswer }) {
  const query = useBeds({ unitId: initial.unit.id, initial });
  const { unit, at, rows } = query.data;
  const now = useServerNow(at);
  const taken = rows.filter(({ patient }) => patient !== null);
  const free = rows.filter(({ patient }) => patient === null);
  return (
    <>
      <NotRefreshed failing={query.failureCount > 0} at={at} now={now} timeZone={unit.timeZone} />
      <div className="page-margin pb-12">
        <div className="flex min-h-[60px] flex-wrap items-baseline gap-x-5 pt-4">
          <h1 className="t-title">{unit.name}</h1>
          <p className="t-body text-muted">
            {taken.length} ventilated, {free.length} of {rows.length} beds free
          </p>
        </div>
        {taken.length === 0 && <p className="py-8 t-body text-muted">No ventilated patient in this unit.</p>}
        {taken.length > 0 && (
          <div className="t-label text-muted rule-head max-tablet:hidden">
            <div className={columns}>
              <span>Look first</span>
              <span>Bed</span>
              <span>Patient</span>
              <span>Volume</span>
              <span>
                <Subscripted text="Pressure span, cmH2O" />
              </span>
              <span>Due</span>
            </div>
          </div>
        )}
        <ul>
          {taken.map((row) => (
            <Bed key={row.bed.id} row={row} now={now} timeZone={unit.timeZone} />
          ))}
        </ul>
        {free.length > 0 && (
          <p className="pt-4 t-small text-muted">Free: {free.map(({ bed }) => bed.label).join(", ")}</p>
        )}
      </div>
    </>
  );
}

const columns =
  "grid grid-cols-[56px_1fr] items-center gap-x-4 py-1.5 max-tablet:gap-y-1 tablet:grid-cols-[180px_56px_1fr_110px_214px_150px] desk:grid-cols-[250px_80px_260px_170px_240px_1fr]";

/** On a phone the bed's number stands at the left of all its lines. */
const besideBed = "max-tablet:col-start-2";

function Bed({ row, now, timeZone }: { row: BedRow; now: number; timeZone: string }) {
  const { patient, bed, derived } = row;
  if (!patient) return null;
  const mode = ventilationModes.find((each) => each === row.settings?.mode?.value);
  const due = dueInOrder(row.due, now).slice(0, 2);
  return (
    <li className="rule-row">
      <Link href={`/patients/${patient.id}`} className={`${columns} min-h-[64px] hover:bg-surface`}>
        <span className={besideBed}>
          <GroupWord
            group={row.state}
            lastOutside={row.cause.some(({ lastState, state }) => state === "unmeasured" && lastState === "outside")}
          />
          <span className="block t-small">
            <TradeText text={row.state === "inside" ? "" : causeWords(row)} />
          </span>
        </span>
        <span className="n-bed max-desk:text-[42px] max-tablet:order-first max-tablet:text-[34px]">
          <span className="sr-only">Bed </span>
          {bed.label}
        </span>
        <span className={`${besideBed} t-body max-tablet:order-first`}>
          <b className="font-[680]">{patient.initials}</b> {patient.ageYears}
          <span className="block t-label text-muted">
            MRN ··{patient.mrn.slice(-4)}, {row.episode && `day ${row.episode.day}`}
            {mode ? `, ${modeLabel(mode)}` : ", no settings yet"}
          </span>
        </span>
        <Volume derived={derived.vtMlPerKg} />
        <Span row={row} now={now} timeZone={timeZone} />
        <span className={`t-small ${besideBed}`}>
          {due.map((each) => (
            <span key={each.what} className={`block ${each.overdue ? "font-[640] text-edge" : "text-muted"}`}>
              <Subscripted text={dueSentence(each, now, timeZone, true)} />
            </span>
          ))}
        </span>
      </Link>
    </li>
  );
}

function Span({ row, now, timeZone }: { row: BedRow; now: number; timeZone: string }) {
  if (!row.settings) return <span className="t-small text-muted">–</span>;
  const span = spanOf({ ...row, mechanics: null, unit: { timeZone } }, now);
  return (
    <span className={besideBed}>
      <span className="max-tablet:hidden">
        <PressureSpanMini size="row" {...span} />
      </span>
      <span className="tablet:hidden">
        <PressureSpanMini size="phone" {...span} />
      </span>
    </span>
  );
}

function Volume({ derived }: { derived: BedRow["derived"][string] | undefined }) {
  if (!derived || derived.state === "not-asked") return <span className="t-small text-muted">not asked</span>;
  if (derived.value === null) return <span className="t-small text-unm">not measured</span>;
  const decimals = derived.unit === "mL" ? 0 : 1;
  const limits = [derived.limit?.min, derived.limit?.max].filter((limit) => limit !== undefined);
  return (
    <span className={`whitespace-nowrap ${besideBed}`}>
      <Quantity text={displayNumber({ value: derived.value, decimals, limit: limits })} className="n-row" />{" "}
      <span className="t-label text-muted">{derived.unit}</span>
    </span>
  );
}
