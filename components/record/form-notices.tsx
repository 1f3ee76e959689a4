"use client";

import { NotRefreshed } from "@/components/shell/not-refreshed";
import { Button } from "@/components/ui/button";
import { useDeviceClockOffMinutes } from "@/lib/client/server-clock";
import { dayAndDate, timeOfDay } from "@/lib/format";
import { draftedSettings } from "./drafted-settings";
import { latenessOf, timeRefusal } from "./entry-time";
import { movedSince } from "./fill-form";
import { settingValueWords, settingWords } from "./setting-words";
import { lateEffect } from "./late-effect";
import { coreInputOf } from "./core-input";
import { Notice } from "./notice";
import { useRecord, type RecordState } from "./use-record";

export interface DraftNews {
  /** The form holds work that was kept on this device. */
  restored: boolean;
  inOtherTab: boolean;
  /** The device refused to keep the draft. */
  notKept: boolean;
  onDiscard: () => void;
}

/** What bears on the entry beyond its fields: its time, its draft, what changed meanwhile, and the connection. */
export function FormNotices({ draft }: { draft: DraftNews }) {
  const record = useRecord();
  const { worksheet, editing, now, failing } = record;
  const { timeZone } = worksheet.unit;
  return (
    <>
      <NotRefreshed failing={failing} at={worksheet.at} now={now} timeZone={timeZone} />
      <ClockOff />
      {worksheet.episode.pausedSince && (
        <Notice>
          Away from the unit since {timeOfDay({ at: worksheet.episode.pausedSince, timeZone })}. Nothing is due.
        </Notice>
      )}
      {draft.restored && (
        <Notice tone="unm" action={<Button onClick={draft.onDiscard}>Discard draft</Button>}>
          Your draft of {timeOfDay({ at: editing.filled.chartedAt, timeZone })},{" "}
          {dayAndDate({ at: editing.filled.chartedAt, timeZone })}, kept on this device. It is not saved yet.
        </Notice>
      )}
      {draft.inOtherTab && (
        <Notice>This entry is open in another tab too. Go on in one of them and close the other.</Notice>
      )}
      {draft.notKept && <Notice>This device does not keep the draft: it would be lost with this page.</Notice>}
      <MovedMeanwhile />
      <TimeNotices record={record} />
    </>
  );
}

function ClockOff() {
  const off = useDeviceClockOffMinutes();
  if (off === 0) return null;
  return (
    <Notice>
      This device’s clock is {Math.abs(off)} min {off > 0 ? "ahead of" : "behind"} the server. The entry’s time follows
      the server.
    </Notice>
  );
}

/** Somebody charted settings after the form was filled: said at once, and asked by the server at the latest. */
function MovedMeanwhile() {
  const { editing, fillAt } = useRecord();
  if (!editing.begun) return null;
  const now = fillAt(editing.filled.chartedAt);
  const moved = movedSince(editing.filled, now);
  if (moved.length === 0) return null;
  const words = moved.map((field) => `${settingWords(field)} ${settingValueWords(field, now.values[field])}`);
  return (
    <Notice action={<Button onClick={() => editing.refill(now)}>Fill anew</Button>}>
      Charted meanwhile: {words.join(", ")}. What you typed stays.
    </Notice>
  );
}

function TimeNotices({ record }: { record: RecordState }) {
  const { worksheet, editing, now } = record;
  if (!editing.begun) return null;
  const { chartedAt } = editing.filled;
  const refusal = timeRefusal({ at: chartedAt, now, intubatedAt: worksheet.episode.intubatedAt });
  const late = latenessOf(chartedAt, now);
  const effects = effectWords(record);
  return (
    <>
      {refusal && <Notice>{refusal}</Notice>}
      {!refusal && (late || effects.length > 0) && (
        <Notice>{[late && `This entry is ${late}.`, ...effects].filter(Boolean).join(" ")}</Notice>
      )}
    </>
  );
}

const minuteMs = 60_000;

function effectWords({ worksheet, editing, now }: RecordState): string[] {
  const { values, filled } = editing;
  const settings = draftedSettings(values, filled);
  if (Object.keys(settings).length === 0) return [];
  const { facts } = coreInputOf(worksheet);
  // The clock on screen moves in steps, and may stand before an entry that was just begun.
  const atLeast = Math.max(now, Date.parse(filled.chartedAt));
  const effect = lateEffect({ facts, chartedAt: filled.chartedAt, settings, now: atLeast });
  const late = now - Date.parse(filled.chartedAt) > 5 * minuteMs;
  const stays = effect.staysNow.map(
    ({ field, value }) => `${settingWords(field)} stays ${settingValueWords(field, value)} now.`,
  );
  if (!late || effect.altersNow.length === 0) return stays;
  const alters = effect.altersNow.map(settingWords).join(", ");
  return [`It alters now: ${alters}.`, ...stays];
}
