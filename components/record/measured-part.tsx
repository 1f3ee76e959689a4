"use client";

import { useState } from "react";
import { addedMechanicsOf, observationOrder, openMechanicsOf } from "./form-fields";
import { HoldReason } from "./hold-reason";
import { MeasuredRow } from "./measured-row";
import { ColumnHead } from "@/components/worksheet/column-head";
import styles from "./record.module.css";
import { useRecord } from "./use-record";
import { YesNoRow } from "./yes-no-row";

/** What was read off the ventilator and the monitor: the usual rows open, the others behind 'Add a measurement'. */
export function MeasuredPart() {
  const { mode, worksheet, editing } = useRecord();
  const { can } = worksheet;
  const mechanics = can.mechanics && mode ? openMechanicsOf(mode) : [];
  const [asked, setAsked] = useState(false);
  // Nobody should have to open what is all there is to enter, nor hunt for what they have entered before.
  const open = asked || mechanics.length === 0 || hasAdded(editing.values);
  if (!can.mechanics && !can.observations) return null;
  return (
    <section aria-label="Measured" className={`${styles.measured} px-4 tablet:px-0`}>
      <ColumnHead title="Measured" aside={mechanics.length > 0 ? "pressures in cmH2O" : undefined} />
      {mechanics.map((field) => (
        <MeasuredRow key={field} part="mechanics" field={field} />
      ))}
      <HoldReason />
      {open ? (
        <Added />
      ) : (
        <button
          type="button"
          onClick={() => setAsked(true)}
          className="min-h-14 py-2 text-left text-[17px] font-[640] text-accent"
        >
          Add a measurement
        </button>
      )}
    </section>
  );
}

function hasAdded(values: ReturnType<typeof useRecord>["editing"]["values"]): boolean {
  const entered = (text: string | undefined) => (text ?? "") !== "";
  return (
    values.breathStacking !== null ||
    values.endInspiratoryFlowZero !== null ||
    Object.values(values.observations).some(entered) ||
    (
      ["minuteVolumeLPerMin", "meanAirwayPressureCmH2O", "pesEndInspiratoryCmH2O", "pesEndExpiratoryCmH2O"] as const
    ).some((field) => entered(values.mechanics[field]))
  );
}

function Added() {
  const { mode, worksheet, editing } = useRecord();
  const { values, set } = editing;
  const mechanics = worksheet.can.mechanics && mode ? addedMechanicsOf(mode) : [];
  const readsTotalRate =
    worksheet.can.mechanics && mode !== null && openMechanicsOf(mode).includes("respiratoryRateTotal");
  const observations = observationOrder.filter((field) => !(field === "respiratoryRateTotal" && readsTotalRate));
  return (
    <>
      {mechanics.slice(0, 2).map((field) => (
        <MeasuredRow key={field} part="mechanics" field={field} />
      ))}
      {worksheet.can.mechanics && mode?.includes("PC") && (
        <YesNoRow
          label="Flow at end of inspiration"
          yes="zero"
          no="not zero"
          value={values.endInspiratoryFlowZero}
          onChange={(value) => set("endInspiratoryFlowZero", value)}
        />
      )}
      {mechanics.length > 0 && (
        <YesNoRow
          label="Breath stacking"
          yes="seen"
          no="not seen"
          value={values.breathStacking}
          onChange={(value) => set("breathStacking", value)}
        />
      )}
      {mechanics.slice(2).map((field) => (
        <MeasuredRow key={field} part="mechanics" field={field} />
      ))}
      {worksheet.can.observations &&
        observations.map((field) => <MeasuredRow key={field} part="observations" field={field} />)}
    </>
  );
}
