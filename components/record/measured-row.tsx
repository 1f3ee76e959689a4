"use client";

import { MeasuredField } from "@/components/ui/measured-field";
import { displayNumber, timeOfDay } from "@/lib/format";
import { Subscripted } from "@/components/figures/subscripted";
import { shownNumber } from "./drafted-settings";
import { FieldRow } from "./field-row";
import { mechanicsStyles, observationStyles, type MechanicsNumber, type ObservationNumber } from "./form-fields";
import { focusHoldWords } from "./hold-focus";
import { holdWords } from "./hold-words";
import { refusalKey } from "./refusals";
import { sameTarget, targetName, type TypingTarget } from "./typing";
import { useRecord, type RecordState } from "./use-record";

type MeasuredRowProps =
  { part: "mechanics"; field: MechanicsNumber } | { part: "observations"; field: ObservationNumber };

/** A measured number: empty until it is entered, with the last one and its time beside it, never inside it. */
export function MeasuredRow(target: MeasuredRowProps) {
  const record = useRecord();
  const { editing, typing, readiness, refused } = record;
  const style = target.part === "mechanics" ? mechanicsStyles[target.field] : observationStyles[target.field];
  const text = editing.values[target.part][target.field] ?? "";
  const isTyping = sameTarget(typing.target, target);
  const { hold } = editing.values;
  const isPlateau = target.field === "plateauCmH2O";
  const openWords = () => {
    typing.open(target);
    focusHoldWords();
  };
  const word = isPlateau
    ? { text: hold ? holdWords[hold] : "hold?", chosen: hold !== null, onOpen: openWords }
    : undefined;
  const error =
    readiness.refusals[refusalKey(target.part, target.field)] ??
    refused.find(({ path }) => path === target.field || path === targetName(target))?.message;
  const entered = text.trim() !== "" || (isPlateau && hold !== null);
  return (
    <FieldRow
      label={style.label}
      name={targetName(target)}
      sub={<Subscripted text={subWords(record, target, style.unit)} />}
      bar={entered ? "accent" : null}
      tall={isPlateau}
      error={isTyping && text.length < 2 ? undefined : error}
    >
      <MeasuredField
        label={style.label}
        text={text}
        onChange={(next) => editing.set(targetName(target), next)}
        onOpen={() => typing.open(target)}
        typing={isTyping}
        {...(word && { word })}
      />
    </FieldRow>
  );
}

function lastReading({ worksheet }: RecordState, { part, field }: TypingTarget): string | null {
  const last = worksheet[part]?.[field];
  if (!last || typeof last.value !== "number") return null;
  const at = timeOfDay({ at: last.chartedAt, timeZone: worksheet.unit.timeZone });
  return `was ${displayNumber({ value: last.value, decimals: Number.isInteger(last.value) ? 0 : 1 })} at ${at}`;
}

function subWords(record: RecordState, target: TypingTarget, unit: string): string {
  const { values, filled } = record.editing;
  const typed = values[target.part][target.field] ?? "";
  if (target.field === "plateauCmH2O" && typed !== "" && values.hold === null) return "how was the hold?";
  if (target.field === "totalPeepCmH2O" && typed === "") {
    const set = shownNumber(values, filled, "peepCmH2O");
    if (set !== null) return `if empty, set PEEP ${displayNumber({ value: set, decimals: 0 })}`;
  }
  return [unit, lastReading(record, target)].filter(Boolean).join(", ");
}
