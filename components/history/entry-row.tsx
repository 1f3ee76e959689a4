import { useState } from "react";
import { Subscripted } from "@/components/figures/subscripted";
import type { Entry, Worksheet } from "@/lib/contracts";
import { dayAndDate, timeOfDay } from "@/lib/format";
import { CorrectForm } from "./correct-form";
import { entryWords } from "./entry-words";
import { VoidForm } from "./void-form";

interface EntryRowProps {
  entry: Entry;
  sheet: Worksheet;
  supersededBy: Entry | undefined;
}

const lateAfterMs = 60 * 60_000;

/** One entry of the history: when it was true, what it says, who charted it, and what became of it. */
export function EntryRow({ entry, sheet, supersededBy }: EntryRowProps) {
  const [open, setOpen] = useState<"correct" | "void" | null>(null);
  const { timeZone } = sheet.unit;
  const struck = entry.supersededById !== null;
  const late = Date.parse(entry.recordedAt) - Date.parse(entry.chartedAt) > lateAfterMs;
  const mayCorrect = sheet.can.correct && sheet.can[entry.kind] && !struck && entry.correction !== "void";
  const close = () => setOpen(null);
  return (
    <li className="py-3 rule-row">
      <p className="t-label text-muted">
        {dayAndDate({ at: entry.chartedAt, timeZone })} {timeOfDay({ at: entry.chartedAt, timeZone })},{" "}
        {entry.author.name}
        {late && `, charted late at ${timeOfDay({ at: entry.recordedAt, timeZone })}`}
      </p>
      <p className="t-body">
        {struck ? (
          <del className="text-muted">
            <Subscripted text={entryWords(entry)} />
          </del>
        ) : (
          <Subscripted text={entryWords(entry)} />
        )}
      </p>
      {struck && <Struck by={supersededBy} timeZone={timeZone} />}
      {entry.correction === "replace" && (
        <p className="t-label text-muted">Corrects an earlier entry: {entry.reason}</p>
      )}
      {entry.correction === "void" && <p className="t-label text-muted">Voids an earlier entry: {entry.reason}</p>}
      {!entry.correction && entry.reason && <p className="t-label text-muted">Reason: {entry.reason}</p>}
      {mayCorrect && open === null && (
        <p className="flex gap-2 pt-1">
          {entry.kind !== "settings-checks" && <SmallButton onClick={() => setOpen("correct")}>Correct</SmallButton>}
          <SmallButton onClick={() => setOpen("void")}>Void</SmallButton>
        </p>
      )}
      {open === "void" && <VoidForm entry={entry} patientId={sheet.patient.id} onDone={close} />}
      {open === "correct" && <CorrectForm entry={entry} sheet={sheet} onDone={close} />}
    </li>
  );
}

function Struck({ by, timeZone }: { by: Entry | undefined; timeZone: string }) {
  if (!by) return <p className="t-label text-outside">Struck through by a later entry.</p>;
  const verb = by.correction === "void" ? "Voided" : "Corrected";
  return (
    <p className="t-label text-outside">
      {verb} by {by.author.name} at {timeOfDay({ at: by.recordedAt, timeZone })}: {by.reason}
    </p>
  );
}

function SmallButton({ onClick, children }: { onClick: () => void; children: string }) {
  return (
    <button type="button" className="min-h-[44px] pr-4 t-state text-accent underline" onClick={onClick}>
      {children}
    </button>
  );
}
