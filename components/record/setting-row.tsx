"use client";

import { useId } from "react";
import { Quantity } from "@/components/figures/quantity";
import { Subscripted } from "@/components/figures/subscripted";
import { Stepper } from "@/components/ui/stepper";
import { displayNumber, fio2TakenText } from "@/lib/format";
import { chartedRanges, type NumericSettingField } from "@/lib/physiology";
import { isChanged, shownNumber } from "./drafted-settings";
import { FieldRow } from "./field-row";
import { filledNumber } from "./filled";
import { limitsFieldOf, settingStyles } from "./form-fields";
import { orderedStops } from "./ordered-stops";
import { refusalKey } from "./refusals";
import { sameTarget, targetName } from "./typing";
import { useRecord } from "./use-record";

/** A setting with its stepper; filled with what is in force, marked once it differs. */
export function SettingRow({ field }: { field: NumericSettingField }) {
  const record = useRecord();
  const errorId = useId();
  const { editing, typing, readiness, mode, worksheet } = record;
  const { values, filled } = editing;
  const style = settingStyles[field];
  const target = { part: "settings", field } as const;
  const shown = shownNumber(values, filled, field);
  const changed = isChanged(values, filled, field);
  const isTyping = sameTarget(typing.target, target);
  const write = (value: number) => displayNumber({ value, decimals: style.decimals });
  const typed = values.settings[field];
  const text = typed && (isTyping || shown === null) ? typed : shown === null ? "–" : write(shown);
  const error = readiness.refusals[refusalKey("settings", field)] ?? refusedByServer(record, field);
  const { min, max } = chartedRanges[limitsFieldOf(field, mode)].refuse;
  return (
    <FieldRow
      label={style.label}
      name={targetName(target)}
      sub={<Sub field={field} shown={shown} was={changed ? filledNumber(filled, field) : null} typed={typed} />}
      bar={changed ? (leavesOrder(record, field) ? "outside" : "accent") : null}
      error={isTyping && !readyToRefuse(typed) ? undefined : error}
      errorId={errorId}
    >
      <Stepper
        label={style.label}
        spoken={shown === null ? "not charted" : `${write(shown)} ${style.unit}`}
        value={shown}
        text={text}
        step={style.step}
        min={min}
        max={max}
        limits={orderedStops(field, worksheet, values, filled)}
        onChange={(value) => {
          editing.set(`settings.${field}`, String(value));
          typing.close();
        }}
        onKeypad={(firstKey) => typing.open(target, firstKey)}
        typing={isTyping}
      />
    </FieldRow>
  );
}

/** Half a number is not refused while it is still being typed: '0' on the way to '0.45'. */
function readyToRefuse(typed: string | undefined): boolean {
  return (typed ?? "").length > 2;
}

function refusedByServer({ refused }: ReturnType<typeof useRecord>, field: string): string | undefined {
  return refused.find(({ path }) => path === field || path === `settings.${field}`)?.message;
}

function leavesOrder({ readiness, mode }: ReturnType<typeof useRecord>, field: NumericSettingField): boolean {
  const of = (metric: string) => readiness.departures.some((departure) => departure.metric === metric);
  if (field === "tidalVolumeMl") return of("vtMlPerKg") || of("vtMl");
  if (field === "pressureAbovePeepCmH2O") return of("drivingPressureCmH2O") || of("plateauCmH2O");
  return field === "peepCmH2O" && mode !== null && of("plateauCmH2O");
}

interface SubProps {
  field: NumericSettingField;
  shown: number | null;
  was: number | null;
  typed: string | undefined;
}

function Sub({ field, shown, was, typed }: SubProps) {
  const { editing, mode } = useRecord();
  const { values, filled } = editing;
  const style = settingStyles[field];
  const pattern = values.flowPattern ?? filled.values["flowPattern"];
  const words = {
    fio2:
      typed && fio2TakenText(typed) && !typed.includes(".")
        ? fio2TakenText(typed)!
        : `${Math.round((shown ?? 0) * 100)} %`,
    flowLPerMin:
      pattern && mode !== "HFNO" ? `L/min, ${pattern === "decelerating" ? "descending" : "square"}` : "L/min",
    pressureAbovePeepCmH2O: peakAbout(shown, shownNumber(values, filled, "peepCmH2O")),
  } as Partial<Record<NumericSettingField, string>>;
  return (
    <>
      <Subscripted text={words[field] ?? style.unit} />
      {was !== null && (
        <>
          , was{" "}
          <Quantity text={displayNumber({ value: was, decimals: style.decimals })} className="text-[16px] text-ink" />
        </>
      )}
    </>
  );
}

function peakAbout(pressure: number | null, peep: number | null): string {
  if (pressure === null || peep === null) return "cmH2O";
  return `cmH2O, peak about ${displayNumber({ value: pressure + peep, decimals: 0 })}`;
}
