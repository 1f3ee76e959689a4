"use client";

import { createContext, useContext, useMemo, useState } from "react";
import type { Issue, Worksheet } from "@/lib/contracts";
import { serverNow, useServerNow } from "@/lib/client/server-clock";
import { useWorksheet } from "@/lib/client/use-worksheet";
import { coreInputOf } from "./core-input";
import { shownMode } from "./drafted-settings";
import { fillForm } from "./fill-form";
import type { Filled } from "./filled";
import { liveResult, type LiveResult } from "./live-result";
import type { RecordValues } from "./record-values";
import { readinessOf, type Readiness } from "./readiness";
import { useTyping, type Typing } from "./use-typing";
import { withPending, type Pending } from "./pending-facts";
import { useRecordValues, type RecordEditing } from "./use-record-values";

export interface Person {
  id: string;
  name: string;
}

export interface RecordState {
  person: Person;
  worksheet: Worksheet;
  /** The worksheet could not be refreshed. */
  failing: boolean;
  now: number;
  editing: RecordEditing;
  mode: ReturnType<typeof shownMode>;
  /** This moment by the server's clock, in ms; never before what is shown. */
  clock: () => number;
  /** The form as it would be filled at a time. */
  fillAt: (at: number | string) => Filled;
  judge: (values: RecordValues, filled: Filled) => Readiness;
  readiness: Readiness;
  live: LiveResult;
  typing: Typing;
  /** What the server refused, until the next change. */
  refused: Issue[];
  setRefused: (issues: Issue[]) => void;
}

interface RecordInput {
  initial: Worksheet;
  person: Person;
  /** This page's own entry, until the record has it. */
  pending: Pending | null;
}

/** Everything the record form shows, worked out from the record, the clock and what was typed. */
export function useRecordState({ initial, person, pending }: RecordInput): RecordState {
  const query = useWorksheet({ patientId: initial.patient.id, initial, withFacts: true });
  const answered = query.data;
  const worksheet = useMemo(() => {
    const facts = withPending(coreInputOf(answered).facts, pending);
    return { ...answered, facts: facts as Worksheet["facts"] };
  }, [answered, pending]);
  // The clock on screen moves in steps: never before an entry of this page, which would not be in force yet.
  const now = Math.max(useServerNow(worksheet.at), pending ? Date.parse(pending.filled.chartedAt) : 0);
  const core = useMemo(() => coreInputOf(worksheet), [worksheet]);
  const { timeZone } = worksheet.unit;
  const fillAt = (at: number | string) => fillForm({ facts: core.facts, at, timeZone });
  const clock = () => Math.max(serverNow(), Date.parse(worksheet.at));
  const [refused, setRefused] = useState<Issue[]>([]);
  const editing = useRecordValues({
    shown: fillAt(now),
    fillNow: () => fillAt(clock()),
    onEdit: () => setRefused([]),
  });
  const { values, filled } = editing;
  const judged = {
    targets: core.targets,
    pbwKg: worksheet.pbwKg,
    tidalVolumeStepMl: worksheet.unit.steps["tidalVolumeMl"] ?? 10,
  };
  const judge = (judgedValues: RecordValues, over: Filled) => readinessOf(judgedValues, over, judged);
  const readiness = judge(values, filled);
  const live = liveResult({ worksheet, values, filled, refusals: readiness.refusals });
  const typing = useTyping(editing);
  return {
    person,
    worksheet,
    failing: query.failureCount > 0,
    now,
    editing,
    mode: shownMode(values, filled),
    clock,
    fillAt,
    judge,
    readiness,
    live,
    typing,
    refused,
    setRefused,
  };
}

const RecordContext = createContext<RecordState | null>(null);

export const RecordProvider = RecordContext.Provider;

export function useRecord(): RecordState {
  const record = useContext(RecordContext);
  if (!record) throw new Error("The record form's parts stand inside RecordProvider.");
  return record;
}
