"use client";

import { ArrowLeft } from "lucide-react";
import Link from "next/link";
import type { ReactNode } from "react";
import { Quantity } from "@/components/figures/quantity";
import { DemoChip } from "@/components/shell/demo-chip";
import { heightWords } from "@/components/worksheet/height-words";
import type { Worksheet } from "@/lib/contracts";
import { calendarDate, displayNumber } from "@/lib/format";
import styles from "./record.module.css";

interface PatientHeaderProps {
  worksheet: Worksheet;
  onHeight: () => void;
  /** Time and mode of the entry; beside the patient on a tablet, in a row of their own on a phone. */
  children?: ReactNode;
}

/** Who is being charted on: bed, full name, birth date, full MRN, and what PBW rests on. Stays in sight. */
export function PatientHeader({ worksheet, onHeight, children }: PatientHeaderProps) {
  const { patient, episode } = worksheet;
  return (
    <header className={styles.strip}>
      <div
        data-record-head
        className={`${styles.identity} flex min-h-[60px] items-center gap-3 px-4 py-1.5 tablet:px-6 desk:px-8`}
      >
        <Link
          href={`/patients/${patient.id}`}
          aria-label="Back to the worksheet"
          className="-ml-2 grid size-11 shrink-0 place-items-center text-accent"
        >
          <ArrowLeft aria-hidden="true" size={24} />
        </Link>
        <span className="-ml-2 shrink-0 n-bed text-[34px] tablet:text-[42px]">
          <span className="sr-only">Bed </span>
          {episode.bed?.label ?? "–"}
        </span>
        <div className="min-w-0 flex-1">
          <h1 className="text-[17px] leading-tight font-[680]">
            {patient.name}{" "}
            <span className="tablet:hidden">
              <DemoChip />
            </span>
          </h1>
          <p className="t-label text-muted">
            {calendarDate(patient.birthDate)}, MRN {patient.mrn}
          </p>
        </div>
        <Pbw worksheet={worksheet} onHeight={onHeight} />
      </div>
      {children}
    </header>
  );
}

function Pbw({ worksheet, onHeight }: Pick<PatientHeaderProps, "worksheet" | "onHeight">) {
  const { pbwKg, height, can } = worksheet;
  const cell = `${styles.pbw} max-w-[108px] shrink-0 text-right leading-tight tablet:max-w-none tablet:self-stretch tablet:border-l tablet:border-hair tablet:pl-5 tablet:text-left`;
  if (!height && can.heights) {
    return (
      <button type="button" onClick={onHeight} className="min-h-11 shrink-0 rounded-[6px] px-3 t-state control">
        Measure height
      </button>
    );
  }
  const words = (
    <>
      <Quantity
        className="block text-[17px] font-[660]"
        text={pbwKg === null ? "no PBW" : `${displayNumber({ value: pbwKg, decimals: 1 })} kg`}
      />
      <span className="block t-label text-muted">
        {height ? `PBW, ${heightWords[height.method].short}` : "no height"}
      </span>
    </>
  );
  if (!can.heights) return <div className={cell}>{words}</div>;
  return (
    <button type="button" onClick={onHeight} title="Record height" className={`min-h-11 ${cell}`}>
      {words}
      <span className="sr-only">, record height</span>
    </button>
  );
}
