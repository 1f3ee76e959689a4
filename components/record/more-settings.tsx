"use client";

import { useState } from "react";
import { fieldsOfMode, type VentilationMode } from "@/lib/physiology";
import { IeRow } from "./ie-row";
import { SettingRow } from "./setting-row";
import styles from "./record.module.css";
import { useRecord } from "./use-record";
import { YesNoRow } from "./yes-no-row";

/** What is seldom changed: the flow's pattern, the trigger, and I:E for those who read it so. */
export function MoreSettings() {
  const { mode, worksheet } = useRecord();
  if (!mode || !worksheet.can.settingsFields.includes("mode")) return null;
  return (
    <section aria-label="More settings" className={`${styles.more} px-4 tablet:px-0`}>
      <MoreRows mode={mode} />
    </section>
  );
}

function MoreRows({ mode }: { mode: VentilationMode }) {
  const [open, setOpen] = useState(false);
  const used = fieldsOfMode(mode);
  const timed = used.has("inspiratoryTimeS");
  const parts = [used.has("flowPattern") && "pattern", used.has("triggerType") && "trigger", timed && "I:E"];
  const words = parts.filter(Boolean).join(", ");
  if (words === "") return null;
  if (!open) {
    return (
      <button type="button" onClick={() => setOpen(true)} className="min-h-12 py-2 text-left t-state text-accent">
        {words.charAt(0).toUpperCase() + words.slice(1)}
      </button>
    );
  }
  return (
    <>
      {used.has("flowPattern") && <PatternRow />}
      {timed && <IeRow />}
      {used.has("triggerType") && <TriggerRows />}
    </>
  );
}

function PatternRow() {
  const { values, filled, set } = useRecord().editing;
  const shown = values.flowPattern ?? filled.values["flowPattern"];
  return (
    <YesNoRow
      label="Flow pattern"
      yes="descending"
      no="square"
      value={shown === "decelerating" ? true : shown === "square" ? false : null}
      onChange={(descending) => set("flowPattern", descending === null ? null : descending ? "decelerating" : "square")}
    />
  );
}

function TriggerRows() {
  const { values, filled, set } = useRecord().editing;
  const shown = values.triggerType ?? filled.values["triggerType"];
  return (
    <>
      <YesNoRow
        label="Trigger"
        yes="by flow"
        no="by pressure"
        value={shown === "flow" ? true : shown === "pressure" ? false : null}
        onChange={(byFlow) => set("triggerType", byFlow === null ? null : byFlow ? "flow" : "pressure")}
      />
      {shown === "flow" && <SettingRow field="triggerLPerMin" />}
      {shown === "pressure" && <SettingRow field="triggerCmH2O" />}
    </>
  );
}
