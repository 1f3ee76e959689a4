"use client";

import Link from "next/link";
import { Subscripted } from "@/components/figures/subscripted";
import { Button } from "@/components/ui/button";
import { ErrorNote } from "@/components/ui/error-note";
import type { Pending } from "./pending-facts";
import { sentWords } from "./sent-words";
import { useRecord } from "./use-record";
import type { RecordScreenState } from "./use-record-screen";
import styles from "./record.module.css";

interface SentFootProps {
  screen: RecordScreenState;
  pending: Pending;
  onNext: (focus: string | null) => void;
}

/** What comes next, pinned: the hold that is due, Undo, and the way on. */
export function SentFoot({ screen, pending, onNext }: SentFootProps) {
  const record = useRecord();
  const { title, sentence, wantsHold } = sentWords(record, pending);
  const { flow } = screen;
  return (
    <div className={`${styles.panel} px-4 pt-4 pb-2 tablet:px-6 desk:px-8`}>
      <h2 className="text-[20px] font-[680]">{title}</h2>
      {sentence && (
        <p className="pt-1 t-body">
          <Subscripted text={sentence} />
        </p>
      )}
      <div className="flex flex-wrap gap-2 pt-4 tablet:max-w-[560px]">
        {pending.undo !== "done" && (
          <Button size="save" onClick={flow.undo} disabled={flow.undoing} className="min-w-[110px]">
            Undo
          </Button>
        )}
        <Button size="save" look="primary" onClick={() => onNext(wantsHold ? "measurements" : null)} className="flex-1">
          {wantsHold ? "Enter plateau" : "Another entry"}
        </Button>
      </div>
      {flow.undoProblem && <ErrorNote>{flow.undoProblem}</ErrorNote>}
      <p className="flex flex-wrap justify-between gap-x-6 py-1.5 t-label text-muted">
        <span>{undoWords(pending, flow.sending)}</span>
        <Link href={`/patients/${record.worksheet.patient.id}`} className="min-h-6 text-accent underline">
          Worksheet
        </Link>
      </p>
    </div>
  );
}

function undoWords({ undo }: Pending, sending: boolean): string {
  if (undo === "done") return "The void is on record too, with your name.";
  if (undo === "asked")
    return sending ? "Undo: the void is filed as soon as the entry has arrived." : "Filing the void.";
  return "Undo files a void: the entry stays readable, struck through.";
}
