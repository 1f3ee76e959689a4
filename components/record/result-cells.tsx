"use client";

import { DeltaP } from "@/components/figures/delta";
import { timeOfDay } from "@/lib/format";
import { ResultCell } from "./result-cell";
import { toldResults } from "./told-results";
import { useRecord } from "./use-record";
import styles from "./record.module.css";

/** mL/kg and driving pressure, worked out while a person types. */
export function ResultCells() {
  const record = useRecord();
  const { volume, driving } = toldResults(record);
  const shown = record.live.ifRelaxed && driving.number !== null ? { ...driving, unit: "if relaxed" } : driving;
  return (
    <div
      className={`${styles.cells} flex items-stretch gap-3 py-1.5 tablet:gap-6`}
      aria-live="polite"
      aria-atomic="true"
    >
      <ResultCell name="Volume per kg" words={volume} />
      <div className="flex min-w-0 items-start gap-2 border-l border-hair pl-2 tablet:pl-6">
        <ResultCell
          name="Driving pressure"
          before={<DeltaP className="text-[18px] font-[640]" />}
          words={record.mode ? shown : { ...shown, aside: null }}
        />
        <HoldTime />
      </div>
    </div>
  );
}

/** When the hold was that a result still rests on, where it is not this entry's own. */
function HoldTime() {
  const { live, worksheet, editing } = useRecord();
  const { driving } = live;
  if (driving?.value == null || driving.chartedAt === null) return null;
  if (Date.parse(driving.chartedAt) === Date.parse(editing.filled.chartedAt)) return null;
  return (
    <span className={`${styles.long} ml-auto pt-2 text-right t-label leading-tight text-muted`}>
      hold at {timeOfDay({ at: driving.chartedAt, timeZone: worksheet.unit.timeZone })}
    </span>
  );
}
