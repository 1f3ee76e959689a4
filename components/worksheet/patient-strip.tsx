import type { ReactNode } from "react";
import { Quantity } from "@/components/figures/quantity";
import type { Worksheet } from "@/lib/contracts";
import { calendarDate, displayNumber } from "@/lib/format";
import { heightWords } from "./height-words";

interface PatientStripProps {
  sheet: Worksheet;
  /** Hours since intubation, whole. */
  hours: number;
  actions: ReactNode;
}

/** Who this is, so that nobody charts on the wrong patient: bed, full name, birth date, full MRN, and what PBW rests on. */
export function PatientStrip({ sheet, hours, actions }: PatientStripProps) {
  const { patient, episode, height } = sheet;
  const sex = height?.sexForPbw ? `, ${height.sexForPbw}` : "";
  return (
    <header className="sticky top-0 z-20 border-b border-hair bg-paper">
      <div className="flex min-h-[60px] flex-wrap items-stretch page-margin desk:min-h-[68px]">
        <div className="flex items-center gap-4 py-1.5 pr-5">
          <span className="n-bed max-desk:text-[42px] max-tablet:text-[34px]">
            <span className="sr-only">Bed </span>
            {episode.bed?.label ?? "–"}
          </span>
          <div>
            <h1 className="t-strip max-tablet:text-[18px]">
              {patient.name}, {patient.ageYears}
              {sex}
            </h1>
            <p className="t-label text-muted">
              born {calendarDate(patient.birthDate)}, MRN {patient.mrn}, day {episode.day}
              <span className="max-desk:hidden"> ({hours} h)</span>
            </p>
          </div>
        </div>
        <HeightCells sheet={sheet} />
        {episode.pausedSince && <Cell label="Away from the unit">nothing is due</Cell>}
        <div className="ml-auto flex items-center gap-2.5 py-2 max-desk:hidden">{actions}</div>
      </div>
    </header>
  );
}

function HeightCells({ sheet }: { sheet: Worksheet }) {
  const { height, pbwKg, pbwAlternatives } = sheet;
  return (
    <>
      <Cell label={height ? `Height, ${heightWords[height.method].short}` : "Height"}>
        {height ? (
          <Quantity
            text={`${displayNumber({ value: height.heightCm, decimals: Number.isInteger(height.heightCm) ? 0 : 1 })} cm`}
          />
        ) : (
          "not measured"
        )}
      </Cell>
      <Cell label={height && heightWords[height.method].estimated ? "PBW, estimated height" : "PBW, from height"}>
        {pbwKg !== null && <Quantity text={`${displayNumber({ value: pbwKg, decimals: 1 })} kg`} />}
        {pbwKg === null && pbwAlternatives && (
          <Quantity
            text={`${displayNumber({ value: pbwAlternatives.male, decimals: 1 })} male, ${displayNumber({ value: pbwAlternatives.female, decimals: 1 })} female`}
          />
        )}
        {pbwKg === null && !pbwAlternatives && (height ? "none under 120 cm" : "needs height")}
      </Cell>
    </>
  );
}

function Cell({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div className="flex flex-col justify-center border-l border-hair px-5 py-1.5 max-tablet:border-l-0 max-tablet:px-0 max-tablet:pr-5">
      <span className="t-label text-muted">{label}</span>
      <span className="t-strip max-tablet:text-[16px]">{children}</span>
    </div>
  );
}
