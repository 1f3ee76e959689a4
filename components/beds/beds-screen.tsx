"use client";

import Link from "next/link";
import { Quantity } from "@/components/figures/quantity";
import { Subscripted } from "@/components/figures/subscripted";
import { useBeds } from "@/lib/client/use-beds";
import { useServerNow } from "@/lib/client/server-clock";
import type { BedRow, BedsAnswer } from "@/lib/contracts";
import { displayNumber } from "@/lib/format";
import { modeLabel, ventilationModes } from "@/lib/physiology";
import { dueInOrder, dueSentence } from "@/components/worksheet/due-words";
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
          <p className="text-muted t-body">
            {taken.length} ventilated, {free.length} of {rows.length} beds free
          </p>
        </div>
        {taken.length === 0 && <p className="py-8 text-muted t-body">No ventilated patient in this unit.</p>}
        {taken.length > 0 && (
          <div className="text-muted rule-head t-label max-tablet:hidden">
            <div className={columns}>
              <span>Look first</span>
              <span>Bed</span>
              <span>Patient</span>
              <span>Volume</span>
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
          <p className="pt-4 text-muted t-small">Free: {free.map(({ bed }) => bed.label).join(", ")}</p>
        )}
      </div>
    </>
  );
}

const columns =
  "grid grid-cols-[1fr_auto] items-center gap-x-4 py-1.5 tablet:grid-cols-[210px_64px_1fr_150px_1fr] desk:grid-cols-[260px_80px_300px_220px_1fr]";

function Bed({ row, now, timeZone }: { row: BedRow; now: number; timeZone: string }) {
  const { patient, bed, derived } = row;
  if (!patient) return null;
  const mode = ventilationModes.find((each) => each === row.settings?.mode?.value);
  const due = dueInOrder(row.due, now).slice(0, 2);
  return (
    <li className="rule-row">
      <Link href={`/patients/${patient.id}`} className={`${columns} min-h-[64px] hover:bg-surface`}>
        <span>
          <GroupWord
            group={row.state}
            lastOutside={row.cause.some(({ lastState, state }) => state === "unmeasured" && lastState === "outside")}
          />
          <span className="block t-small">
            <Subscripted text={row.state === "inside" ? "" : causeWords(row)} />
          </span>
        </span>
        <span className="n-bed max-desk:text-[42px] max-tablet:order-first max-tablet:text-[34px]">
          <span className="sr-only">Bed </span>
          {bed.label}
        </span>
        <span className="t-body">
          <b className="font-[680]">{patient.initials}</b> {patient.ageYears}
          <span className="block text-muted t-label">
            MRN ··{patient.mrn.slice(-4)}, {row.episode && `day ${row.episode.day}`}
            {mode ? `, ${modeLabel(mode)}` : ", no settings yet"}
          </span>
        </span>
        <Volume derived={derived.vtMlPerKg} />
        <span className="t-small">
          {due.map((each) => (
            <span key={each.what} className={`block ${each.overdue ? "font-[640] text-edge" : "text-muted"}`}>
              <Subscripted text={dueSentence(each, now, timeZone)} />
            </span>
          ))}
        </span>
      </Link>
    </li>
  );
}

function Volume({ derived }: { derived: BedRow["derived"][string] | undefined }) {
  if (!derived || derived.state === "not-asked") return <span className="text-muted t-small">not asked</span>;
  if (derived.value === null) return <span className="text-unm t-small">not measured</span>;
  const decimals = derived.unit === "mL" ? 0 : 1;
  const limits = [derived.limit?.min, derived.limit?.max].filter((limit) => limit !== undefined);
  return (
    <span className="whitespace-nowrap">
      <Quantity text={displayNumber({ value: derived.value, decimals, limit: limits })} className="n-row" />{" "}
      <span className="text-muted t-label">{derived.unit}</span>
    </span>
  );
}
