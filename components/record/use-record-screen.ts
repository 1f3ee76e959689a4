"use client";

import { useState } from "react";
import type { FieldConflict, Worksheet } from "@/lib/contracts";
import { newClientKey } from "@/lib/client/new-client-key";
import { useRefetchWorksheet } from "@/lib/client/use-worksheet";
import { bedsideEntry, settingsCheck } from "./entry-body";
import type { Filled } from "./filled";
import { mergeValues } from "./merge-values";
import type { RecordDraft } from "./record-draft";
import { emptyRecord, type RecordValues } from "./record-values";
import { refusalWords } from "./refusal-words";
import { conflictOf, useEntryFlow, type EntryFlow, type Refusal } from "./use-entry-flow";
import { useRecordState, type Person, type RecordState } from "./use-record";
import { useRecordDraft } from "./use-record-draft";

export interface RecordScreenState {
  record: RecordState;
  flow: EntryFlow;
  view: "form" | "sent" | "conflict";
  conflict: FieldConflict[];
  /** Why the last save was refused. */
  problem: string | null;
  restored: boolean;
  notKept: boolean;
  movedBed: { from: string; to: string } | null;
  acceptBed: () => void;
  save: () => void;
  check: () => void;
  backToForm: () => void;
  discard: () => void;
  /** Sends what was chosen in a conflict, or takes the form up with it where that asks something new. */
  settle: (values: RecordValues, filled: Filled) => void;
}

/** The record screen's one conversation: type, send, settle what came between, undo, go on. */
export function useRecordScreen({ initial, person }: { initial: Worksheet; person: Person }): RecordScreenState {
  const flow = useEntryFlow({
    patientId: initial.patient.id,
    onSaved: () => setRestored(false),
    onRefused: (refusal) => refused(refusal),
  });
  const record = useRecordState({ initial, person, pending: flow.pending });
  const { editing, readiness, worksheet } = record;
  const [clientKey, setClientKey] = useState(newClientKey);
  const [view, setView] = useState<RecordScreenState["view"]>("form");
  const [conflict, setConflict] = useState<FieldConflict[]>([]);
  const [problem, setProblem] = useState<string | null>(null);
  const [restored, setRestored] = useState(false);
  const [bed, setBed] = useState(initial.episode.bed);
  const refetch = useRefetchWorksheet(worksheet.patient.id);

  const refused = ({ error, sending }: Refusal) => {
    const fields = conflictOf(error);
    const isCheck = sending.entry.route === "settings-checks";
    if (!isCheck) editing.restore(mergeValues(sending.values, editing.values), sending.filled);
    setProblem(refusalWords(error));
    record.setRefused("errors" in error ? (error.errors as RecordState["refused"]) : []);
    setConflict(fields);
    setView(fields.length > 0 && !isCheck ? "conflict" : "form");
    if (fields.length > 0) {
      setClientKey(newClientKey());
      void refetch();
    }
  };

  const send: EntryFlow["send"] = (sending) => {
    setProblem(null);
    setConflict([]);
    editing.clear();
    record.typing.close();
    setClientKey(newClientKey());
    setView("sent");
    flow.send(sending);
  };
  const found = (draft: RecordDraft) => {
    if (draft.sending) {
      setView("sent");
      flow.send(draft.sending);
    }
    // Whoever was quicker than the device's store goes on with what is typed already.
    if (editing.begun || !draft.filled) return;
    editing.restore(draft.values, draft.filled);
    setRestored(true);
    setClientKey(draft.clientKey);
    if (draft.bedId !== worksheet.episode.bed?.id) setBed(draft.bedId ? { id: draft.bedId, label: "" } : null);
  };
  const { failed } = useRecordDraft({
    owner: { userId: person.id, episodeId: worksheet.episode.id, form: "record" },
    draft: draftOf({ editing, clientKey, bedId: bed?.id ?? null, flow }),
    onFound: found,
  });
  const discard = () => {
    editing.clear();
    record.typing.close();
    setRestored(false);
    setProblem(null);
    setBed(worksheet.episode.bed);
  };

  return {
    record,
    flow,
    view,
    conflict,
    problem,
    restored,
    notKept: failed,
    movedBed: bedMove(bed, worksheet),
    acceptBed: () => setBed(worksheet.episode.bed),
    save: () => {
      const { values, filled } = editing;
      const body = bedsideEntry(values, filled, { clientKey, reason: readiness.reason });
      if (body) send({ entry: { route: "bedside-entries", body }, values, filled });
    },
    check: () => {
      const filled = record.fillAt(record.clock());
      const body = settingsCheck(filled, clientKey);
      if (body) send({ entry: { route: "settings-checks", body }, values: emptyRecord, filled });
    },
    backToForm: () => setView("form"),
    discard,
    settle: (values, filled) => {
      const { blocker, reason } = record.judge(values, filled);
      const body = blocker === null ? bedsideEntry(values, filled, { clientKey, reason }) : null;
      if (body) return send({ entry: { route: "bedside-entries", body }, values, filled });
      setConflict([]);
      setProblem(null);
      editing.restore(values, filled);
      setView("form");
    },
  };
}

function bedMove(from: Worksheet["episode"]["bed"], { episode }: Worksheet): RecordScreenState["movedBed"] {
  const to = episode.bed;
  if (from?.id === to?.id) return null;
  return { from: from?.label || "another bed", to: to?.label ?? "no bed" };
}

interface Kept {
  editing: RecordState["editing"];
  clientKey: string;
  bedId: string | null;
  flow: EntryFlow;
}

function draftOf({ editing, clientKey, bedId, flow }: Kept): RecordDraft | null {
  const { pending } = flow;
  const sending = pending && pending.submissionId === null ? pending : null;
  if (!editing.begun && !sending) return null;
  return {
    version: 1,
    values: editing.values,
    filled: editing.begun ? editing.filled : null,
    clientKey,
    bedId,
    sending: sending && { entry: sending.entry, values: sending.values, filled: sending.filled },
  };
}
