"use client";

import { useState } from "react";
import { AppError, type Worksheet } from "@/lib/contracts";
import { newClientKey } from "@/lib/client/new-client-key";
import { useRefetchWorksheet } from "@/lib/client/use-worksheet";
import { draftOf } from "./draft-of";
import { bedsideEntry, settingsCheck } from "./entry-body";
import type { Filled } from "./filled";
import { mergeValues } from "./merge-values";
import type { RecordDraft, Sending } from "./record-draft";
import { emptyRecord, type RecordValues } from "./record-values";
import { useBedWatch, type BedWatch } from "./use-bed-watch";
import { useEntryFlow, type EntryFlow, type Refusal } from "./use-entry-flow";
import { conflictOf, useOutcome, type Outcome } from "./use-outcome";
import { useRecordState, type Person, type RecordState } from "./use-record";
import { useRecordDraft } from "./use-record-draft";

export interface RecordScreenState extends Pick<Outcome, "view" | "conflict" | "problem" | "backToForm"> {
  record: RecordState;
  flow: EntryFlow;
  bed: BedWatch;
  /** The form holds work that was kept on this device. */
  restored: boolean;
  /** The device refuses to keep a draft. */
  notKept: boolean;
  save: () => void;
  check: () => void;
  discard: () => void;
  /** Sends what was chosen in a conflict, or takes the form up with it where that asks something new. */
  settle: (values: RecordValues, filled: Filled) => void;
}

/** The record screen's one conversation: type, send, settle what came between, undo, go on. */
export function useRecordScreen({ initial, person }: { initial: Worksheet; person: Person }): RecordScreenState {
  const [restored, setRestored] = useState(false);
  const [clientKey, setClientKey] = useState(newClientKey);
  const refetch = useRefetchWorksheet(initial.patient.id);
  const flow = useEntryFlow({
    patientId: initial.patient.id,
    onSaved: () => setRestored(false),
    onRefused: (refusal) => takeBack(refusal),
  });
  const record = useRecordState({ initial, person, pending: flow.pending });
  const { editing, worksheet } = record;
  const bed = useBedWatch(worksheet);
  const outcome = useOutcome();

  function takeBack({ error, sending }: Refusal) {
    const isCheck = sending.entry.route === "settings-checks";
    if (!isCheck) editing.restore(mergeValues(sending.values, editing.values), sending.filled);
    record.setRefused(error instanceof AppError ? error.errors : []);
    outcome.refused(error, !isCheck);
    if (conflictOf(error).length === 0) return;
    setClientKey(newClientKey());
    void refetch();
  }
  function send(sending: Sending) {
    editing.clear();
    record.typing.close();
    setClientKey(newClientKey());
    outcome.sent();
    flow.send(sending);
  }
  function takeUp(draft: RecordDraft) {
    if (draft.sending) {
      outcome.sent();
      flow.send(draft.sending);
    }
    // Whoever was quicker than the device's store goes on with what is typed already.
    if (editing.begun || !draft.filled) return;
    editing.restore(draft.values, draft.filled);
    setRestored(true);
    setClientKey(draft.clientKey);
    bed.startFrom(draft.bedId);
  }
  function sendEntry(values: RecordValues, filled: Filled): boolean {
    const { blocker, reason } = record.judge(values, filled);
    const body = blocker === null ? bedsideEntry(values, filled, { clientKey, reason }) : null;
    if (body) send({ entry: { route: "bedside-entries", body }, values, filled });
    return body !== null;
  }

  const { failed } = useRecordDraft({
    owner: { userId: person.id, episodeId: worksheet.episode.id, form: "record" },
    draft: draftOf({ editing, clientKey, bedId: bed.bedId, pending: flow.pending }),
    onFound: takeUp,
  });
  return {
    ...outcome,
    record,
    flow,
    bed,
    restored,
    notKept: failed,
    save: () => void sendEntry(editing.values, editing.filled),
    check: () => {
      const filled = record.fillAt(record.clock());
      const body = settingsCheck(filled, clientKey);
      if (body) send({ entry: { route: "settings-checks", body }, values: emptyRecord, filled });
    },
    discard: () => {
      editing.clear();
      record.typing.close();
      setRestored(false);
      outcome.clear();
      bed.accept();
    },
    settle: (values, filled) => {
      if (sendEntry(values, filled)) return;
      outcome.clear();
      editing.restore(values, filled);
      outcome.backToForm();
    },
  };
}
