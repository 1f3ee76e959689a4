"use client";

import dynamic from "next/dynamic";
import Link from "next/link";
import { useState } from "react";
import { VolumeLadder } from "@/components/figures/volume-ladder";
import type { HistoryOf } from "@/components/history/history-of";
import type { Worksheet } from "@/lib/contracts";
import { useServerNow } from "@/lib/client/server-clock";
import { useWorksheet } from "@/lib/client/use-worksheet";
import { Connection } from "./connection";
import { DueRail } from "./due-rail";
import { EntryActions, EntryBar } from "./entry-actions";
import { ladderOf } from "./ladder-of";
import { MeasuredColumn } from "./measured-column";
import { PatientStrip } from "./patient-strip";
import { PhoneSummary } from "./phone-summary";
import { SetColumn } from "./set-column";
import { SpanPanel } from "./span-panel";
import { WorksOutColumn } from "./works-out-column";
import type { DerivedRow } from "./rows";

// What opens over the sheet, and its dialog, is fetched when it is first opened.
const HistorySheet = dynamic(() => import("@/components/history/history-sheet").then((part) => part.HistorySheet), {
  ssr: false,
});
const WhereFrom = dynamic(() => import("./where-from").then((part) => part.WhereFrom), { ssr: false });

/** One patient: what is set, what was measured, what it works out to, and what is due. */
export function WorksheetScreen({ initial }: { initial: Worksheet }) {
  const query = useWorksheet({ patientId: initial.patient.id, initial });
  const sheet = query.data;
  const now = useServerNow(sheet.at);
  const [history, setHistory] = useState<HistoryOf | null>(null);
  const [whereFrom, setWhereFrom] = useState<DerivedRow | null>(null);
  const hours = Math.max(0, Math.floor((now - Date.parse(sheet.episode.intubatedAt)) / 3_600_000));
  return (
    <>
      <PatientStrip sheet={sheet} hours={hours} actions={<EntryActions sheet={sheet} />} />
      <Connection sheet={sheet} failing={query.failureCount > 0} now={now} />
      <div className="flex desk:min-h-[calc(100dvh-148px)]">
        <div className="min-w-0 flex-1 page-margin pb-8 desk:pr-6 desk:pb-12">
          <PhoneSummary sheet={sheet} now={now} />
          <Ladder sheet={sheet} />
          <div className="grid tablet:grid-cols-[158px_306px_1fr_204px] desk:grid-cols-[184px_304px_1fr_222px]">
            <div className="tablet:pr-2.5">
              <SetColumn sheet={sheet} onHistory={setHistory} />
            </div>
            <div className={ruled}>
              <MeasuredColumn sheet={sheet} now={now} onHistory={setHistory} />
            </div>
            <div className={ruled}>
              <WorksOutColumn sheet={sheet} now={now} onWhereFrom={setWhereFrom} />
            </div>
            <div className="pl-2 max-tablet:hidden">
              <div className="max-desk:hidden">
                <SpanPanel sheet={sheet} now={now} size="large" />
              </div>
              <div className="desk:hidden">
                <SpanPanel sheet={sheet} now={now} size="medium" />
              </div>
            </div>
          </div>
        </div>
        <DueRail sheet={sheet} now={now} onHistory={setHistory} />
      </div>
      <EntryBar sheet={sheet} now={now} />
      {history && <HistorySheet sheet={sheet} of={history} onClose={() => setHistory(null)} />}
      {whereFrom && <WhereFrom sheet={sheet} row={whereFrom} now={now} onClose={() => setWhereFrom(null)} />}
    </>
  );
}

/** A hairline between the sheet's columns. */
const ruled = "tablet:border-l tablet:border-hair tablet:pr-2.5 tablet:pl-4";

function Ladder({ sheet }: { sheet: Worksheet }) {
  const ladder = ladderOf(sheet);
  const action = sheet.can.heights ? (
    <Link href={`/patients/${sheet.patient.id}/record?focus=height`} className="t-state text-accent underline">
      Measure height
    </Link>
  ) : undefined;
  return (
    <section aria-label="Volume ladder" className="pt-2 max-tablet:hidden">
      <p className="t-label text-muted max-desk:hidden">
        <b className="mr-2 t-head text-ink">Volume ladder</b>
        {sheet.pbwKg !== null && "this patient’s millilitres at each mL/kg PBW. Shaded: "}
        {sheet.pbwKg !== null && (sheet.targets.origin === "order" ? "ordered." : "the unit’s default.")}
      </p>
      <div className="max-desk:hidden">
        <VolumeLadder size="full" {...ladder} action={action} />
      </div>
      <div className="pt-2 desk:hidden">
        <VolumeLadder size="compact" {...ladder} action={action} />
      </div>
    </section>
  );
}
