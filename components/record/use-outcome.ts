"use client";

import { useState } from "react";
import { AppError, type FieldConflict } from "@/lib/contracts";
import { refusalWords } from "./refusal-words";

export interface Outcome {
  view: "form" | "sent" | "conflict";
  conflict: FieldConflict[];
  /** Why the last save was refused. */
  problem: string | null;
  sent: () => void;
  backToForm: () => void;
  /** Both values are shown and chosen from where the refusal names fields; else the form says why. */
  refused: (error: Error, mayChoose: boolean) => void;
  clear: () => void;
}

/** Which of the record's screens stands, and what the server said last. */
export function useOutcome(): Outcome {
  const [view, setView] = useState<Outcome["view"]>("form");
  const [conflict, setConflict] = useState<FieldConflict[]>([]);
  const [problem, setProblem] = useState<string | null>(null);
  const clear = () => {
    setConflict([]);
    setProblem(null);
  };
  return {
    view,
    conflict,
    problem,
    sent: () => {
      clear();
      setView("sent");
    },
    backToForm: () => setView("form"),
    refused: (error, mayChoose) => {
      const fields = conflictOf(error);
      setConflict(fields);
      setProblem(refusalWords(error));
      setView(fields.length > 0 && mayChoose ? "conflict" : "form");
    },
    clear,
  };
}

export function conflictOf(error: Error): FieldConflict[] {
  return error instanceof AppError ? (error.conflict ?? []) : [];
}
