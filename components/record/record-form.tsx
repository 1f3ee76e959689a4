"use client";

import { useState } from "react";
import { PressureSpan } from "@/components/figures/pressure-span";
import { VolumeLadder } from "@/components/figures/volume-ladder";
import { Button } from "@/components/ui/button";
import { ErrorNote } from "@/components/ui/error-note";
import { ladderOf } from "@/components/worksheet/ladder-of";

import { useDraftInOtherTab } from "@/lib/client/use-draft-in-other-tab";
import { draftKey } from "@/lib/client/drafts";
import { timeOfDay } from "@/lib/format";
import { timeRefusal } from "./entry-time";
import { EntryKeypad } from "./entry-keypad";
import { FormNotices } from "./form-notices";
import { liveSpan } from "./live-span";
import { MeasuredPart } from "./measured-part";
import { ModeSheet } from "./mode-sheet";
import { MoreSettings } from "./more-settings";
import { Notice } from "./notice";
import { ColumnHead } from "@/components/worksheet/column-head";
import { PatientHeader } from "./patient-header";
import { ResultPanel } from "./result-panel";
import { SettingsPart } from "./settings-part";
import { SpanWords } from "./span-words";
import { TimeSheet } from "./time-sheet";
import { TitleRow } from "./title-row";
import { useIsTablet } from "./use-is-tablet";
import { useFocusFromAddress, type FormFocus } from "./use-focus-from-address";
import { useRecord } from "./use-record";
import type { RecordScreenState } from "./use-record-screen";
import styles from "./record.module.css";

interface RecordFormProps {
  screen: RecordScreenState;
  focus: FormFocus;
  onHeight: () => void;
}

/** Settings and measured in one form with its time; what it works out to stands pinned below. */
export function RecordForm({ screen, focus, onHeight }: RecordFormProps) {
  const { worksheet, person } = useRecord();
  const [sheet, setSheet] = useState<"time" | "mode" | null>(null);
  const inOtherTab = useDraftInOtherTab(
    draftKey({ userId: person.id, episodeId: worksheet.episode.id, form: "record" }),
  );
  useFocusFromAddress(focus);
  const isTablet = useIsTablet();
  return (
    <>
      <PatientHeader worksheet={worksheet} onHeight={onHeight}>
        <TitleRow onTime={() => setSheet("time")} onMode={() => setSheet("mode")} onCheck={screen.check} />
      </PatientHeader>
      <FormNotices
        draft={{ restored: screen.restored, notKept: screen.notKept, inOtherTab, onDiscard: screen.discard }}
      />
      {screen.problem && <ErrorNote>{screen.problem}</ErrorNote>}
      <StillSending screen={screen} />
      <BedMoved screen={screen} />
      <div className={styles.sheet}>
        <TabletLadder onHeight={onHeight} />
        <SettingsPart onMode={() => setSheet("mode")} />
        <MeasuredPart />
        <MoreSettings />
        <LiveSpan />
        {isTablet && <EntryKeypad />}
      </div>
      <ResultPanel onSave={screen.save} hindrance={useHindrance(screen)} />
      <TimeSheet open={sheet === "time"} onClose={() => setSheet(null)} />
      <ModeSheet open={sheet === "mode"} onClose={() => setSheet(null)} />
    </>
  );
}

function TabletLadder({ onHeight }: { onHeight: () => void }) {
  const { live, worksheet } = useRecord();
  const { pbwKg, order, reading } = ladderOf(live.sheet);
  return (
    <div className={`${styles.tabletOnly} ${styles.tabletLadder} pb-2`}>
      <VolumeLadder
        size="compact"
        pbwKg={pbwKg}
        order={order}
        reading={reading}
        action={worksheet.can.heights && !worksheet.height && <Button onClick={onHeight}>Measure height</Button>}
      />
    </div>
  );
}

function LiveSpan() {
  const { live, now } = useRecord();
  return (
    <section aria-label="Pressure span" className={styles.span}>
      <ColumnHead title="Pressure span" aside="cmH2O" />
      <div className="pt-2">
        <PressureSpan size="medium" {...liveSpan(live, now)} />
      </div>
      <SpanWords />
    </section>
  );
}

/** One entry at a time: the next waits until the one before has arrived. */
function StillSending({ screen }: { screen: RecordScreenState }) {
  const { flow } = screen;
  if (!flow.sending) return null;
  return (
    <Notice tone="unm">
      <b>Kept on this device.</b> The entry before is being sent, try {flow.tryNumber}. Keep this page open.
    </Notice>
  );
}

function BedMoved({ screen }: { screen: RecordScreenState }) {
  const { worksheet } = useRecord();
  const { moved, accept } = screen.bed;
  if (!moved) return null;
  return (
    <Notice action={<Button onClick={accept}>Still this patient</Button>}>
      {worksheet.patient.name} is in {moved.to === null ? "no bed" : `bed ${moved.to}`} now, was in{" "}
      {moved.from === null ? "another bed" : `bed ${moved.from}`} when this form was opened.
    </Notice>
  );
}

function useHindrance(screen: RecordScreenState): string | null {
  const { editing, now, worksheet } = useRecord();
  const { pending } = screen.flow;
  if (screen.flow.sending && pending) {
    const at = timeOfDay({ at: pending.filled.chartedAt, timeZone: worksheet.unit.timeZone });
    return `The entry of ${at} is still being sent: save this one when it has arrived.`;
  }
  if (screen.bed.moved) return "The bed changed: say above that it is still this patient.";
  return timeRefusal({ at: editing.filled.chartedAt, now, intubatedAt: worksheet.episode.intubatedAt });
}
