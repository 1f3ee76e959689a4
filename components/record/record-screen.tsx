"use client";

import { useState } from "react";
import type { Worksheet } from "@/lib/contracts";
import { ConflictView } from "./conflict-view";
import { HeightSheet } from "./height-sheet";
import { LeaveQuestion } from "./leave-question";
import { PatientHeader } from "./patient-header";
import { RecordForm } from "./record-form";
import { SentScreen } from "./sent-screen";
import { RecordProvider, type Person } from "./use-record";
import { useRecordScreen } from "./use-record-screen";

interface RecordScreenProps {
  /** With its facts. */
  initial: Worksheet;
  person: Person;
  /** 'measurements', 'settings', 'height', or a field's name. */
  focus: string | null;
}

/** Everything that can be charted at the bedside so far, by what this person may chart. */
export function RecordScreen({ initial, person, focus }: RecordScreenProps) {
  const screen = useRecordScreen({ initial, person });
  const { record, flow } = screen;
  const { worksheet, editing } = record;
  const [measuringHeight, setMeasuringHeight] = useState(focus === "height" && initial.can.heights);
  const [goTo, setGoTo] = useState(focus);
  const onHeight = () => setMeasuringHeight(true);
  const next = (place: string | null) => {
    setGoTo(place);
    screen.backToForm();
  };
  return (
    <RecordProvider value={record}>
      {!mayChart(worksheet) ? (
        <ReadOnly worksheet={worksheet} />
      ) : screen.view === "conflict" ? (
        <ConflictView screen={screen} onHeight={onHeight} />
      ) : screen.view === "sent" ? (
        <SentScreen screen={screen} onHeight={onHeight} onNext={next} />
      ) : (
        <RecordForm screen={screen} focus={goTo} onHeight={onHeight} />
      )}
      <HeightSheet open={measuringHeight} onClose={() => setMeasuringHeight(false)} />
      <LeaveQuestion unsaved={editing.begun || flow.sending} sending={flow.sending} onDiscard={screen.discard} />
    </RecordProvider>
  );
}

function mayChart({ can, episode }: Worksheet): boolean {
  return episode.endedAt === null && (can.settings || can.mechanics || can.observations || can.heights);
}

function ReadOnly({ worksheet }: { worksheet: Worksheet }) {
  return (
    <>
      <PatientHeader worksheet={worksheet} onHeight={() => undefined} />
      <p className="px-4 py-6 t-body tablet:px-6">
        {worksheet.episode.endedAt ? "This episode has ended." : "Your role reads this patient and charts nothing."} The
        worksheet shows what is on record.
      </p>
    </>
  );
}
