"use client";

import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/button";
import { SideSheet } from "@/components/ui/side-sheet";
import { TextField } from "@/components/ui/text-field";
import { serverNow } from "@/lib/client/server-clock";
import { dayAndDate, timeOfDay } from "@/lib/format";
import { latenessOf, momentsOfTime, timeRefusal } from "./entry-time";
import { useRecord } from "./use-record";

/** When it was true at the bedside: now, or a time of the last 24 h by the unit's clock. */
export function TimeSheet({ open, onClose }: { open: boolean; onClose: () => void }) {
  return (
    <SideSheet open={open} onClose={onClose} title="Time of this entry">
      {open && <TimeForm onClose={onClose} />}
    </SideSheet>
  );
}

function TimeForm({ onClose }: { onClose: () => void }) {
  const { worksheet, editing, fillAt } = useRecord();
  const { timeZone, name } = worksheet.unit;
  const [time, setTime] = useState(timeOfDay({ at: editing.filled.chartedAt, timeZone }));
  const now = serverNow();
  const complete = /^([01]\d|2[0-3]):[0-5]\d$/.test(time);
  const moments = complete ? momentsOfTime({ time, now, timeZone }) : [];
  const refusal = refusalOfTime(time, complete, moments, { now, intubatedAt: worksheet.episode.intubatedAt });
  const take = (at: string | number) => {
    editing.refill(fillAt(at));
    onClose();
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const [only, second] = moments;
    if (only && !second && !refusal) take(only);
  };
  return (
    <form onSubmit={submit} className="flex flex-col gap-4">
      <Button size="entry" onClick={() => take(now)} className="w-full">
        Now, {timeOfDay({ at: now, timeZone })}
      </Button>
      <TextField
        label={`Time by the clock of ${name}`}
        inputMode="numeric"
        placeholder="14:20"
        autoComplete="off"
        hint="Up to 24 h back. The form is filled anew with what was in force then; what you typed stays."
        error={refusal ?? undefined}
        value={time}
        onChange={(event) => setTime(withColon(event.target.value))}
      />
      {moments.length > 1 && <p className="t-body">The clock showed this time twice. Which one?</p>}
      {!refusal &&
        moments.map((moment, index) => (
          <Button
            key={moment}
            size="entry"
            look={moments.length === 1 ? "primary" : "quiet"}
            onClick={() => take(moment)}
          >
            {momentWords(moment, now, timeZone, moments.length > 1 ? index : null)}
          </Button>
        ))}
    </form>
  );
}

/** '1420' is typed faster in gloves than '14:20'. */
function withColon(text: string): string {
  const digits = /^(\d{2})(\d{2})$/.exec(text.trim());
  return digits ? `${digits[1]}:${digits[2]}` : text.trim();
}

function momentWords(moment: string, now: number, timeZone: string, index: number | null): string {
  const late = latenessOf(moment, now);
  const which = index === null ? "" : index === 0 ? " before the clock went back" : " after the clock went back";
  const when = `At ${timeOfDay({ at: moment, timeZone })}, ${dayAndDate({ at: moment, timeZone })}${which}`;
  return late ? `${when}, ${late}` : when;
}

function refusalOfTime(
  time: string,
  complete: boolean,
  moments: string[],
  { now, intubatedAt }: { now: number; intubatedAt: string },
): string | null {
  if (!complete) return time.length >= 5 || time === "" ? "Enter the time as hours and minutes, such as 14:20." : null;
  const [first] = moments;
  if (!first) return "The clock skipped this time: it was put forward that day.";
  return moments.map((at) => timeRefusal({ at, now, intubatedAt })).find((each) => each !== null) ?? null;
}
