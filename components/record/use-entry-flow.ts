"use client";

import { useRef, useState } from "react";
import type { ChartAnswer } from "@/lib/contracts";
import { newClientKey } from "@/lib/client/new-client-key";
import { useChartEntry } from "@/lib/client/use-chart-entry";
import { useVoidSubmission } from "@/lib/client/use-void-submission";
import type { Pending } from "./pending-facts";
import type { Sending } from "./record-draft";

export type Refusal = { error: Error; sending: Sending };

interface EntryFlowInput {
  patientId: string;
  onSaved: () => void;
  onRefused: (refusal: Refusal) => void;
}

export interface EntryFlow {
  /** This page's newest entry, on its way or saved. */
  pending: Pending | null;
  sending: boolean;
  tryNumber: number;
  send: (sending: Sending) => void;
  undo: () => void;
  undoing: boolean;
  /** Why Undo was refused. */
  undoProblem: string | null;
}

/** Sends one entry at a time, keeps trying, and voids it again on Undo, also when Undo is asked before it arrived. */
export function useEntryFlow({ patientId, onSaved, onRefused }: EntryFlowInput): EntryFlow {
  const chart = useChartEntry(patientId);
  const voiding = useVoidSubmission(patientId);
  const [pending, setPending] = useState<Pending | null>(null);
  const [undoProblem, setUndoProblem] = useState<string | null>(null);

  const strike = (submissionId: string) =>
    voiding.mutate(
      { submissionId, body: { clientKey: newClientKey(), reason: undoReason } },
      {
        onSuccess: () => setPending((held) => held && { ...held, undo: "done" }),
        onError: (error) => {
          setUndoProblem(error.message);
          setPending((held) => held && { ...held, undo: "none" });
        },
      },
    );
  const undoAsked = useRef(false);
  const saved = ({ submission, entries }: ChartAnswer) => {
    onSaved();
    setPending((held) => held && { ...held, submissionId: submission.id, entryIds: entries.map(({ id }) => id) });
    // Asked before the entry had arrived: struck as soon as it has a number.
    if (undoAsked.current) strike(submission.id);
  };
  const send = (sending: Sending) => {
    setUndoProblem(null);
    undoAsked.current = false;
    setPending({ ...sending, submissionId: null, entryIds: [], undo: "none" });
    chart.mutate(sending.entry, {
      onSuccess: saved,
      onError: (error) => {
        setPending(null);
        onRefused({ error, sending });
      },
    });
  };
  const undo = () => {
    undoAsked.current = true;
    setUndoProblem(null);
    setPending((held) => held && { ...held, undo: "asked" });
    if (pending?.submissionId) strike(pending.submissionId);
  };
  return {
    pending,
    sending: chart.isPending,
    tryNumber: chart.tryNumber,
    send,
    undo,
    undoing: pending?.undo === "asked",
    undoProblem,
  };
}

const undoReason = "Undo: entered by mistake";
