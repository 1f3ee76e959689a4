"use client";

import { Check } from "lucide-react";
import { useState } from "react";
import { Quantity } from "@/components/figures/quantity";
import { Subscripted } from "@/components/figures/subscripted";
import { Banner } from "@/components/ui/banner";
import type { Worksheet } from "@/lib/contracts";
import { timeOfDay } from "@/lib/format";
import { modeLabel, type VentilationMode } from "@/lib/physiology";
import { NotRefreshed } from "@/components/shell/not-refreshed";
import { PatientHeader } from "./patient-header";
import type { Pending } from "./pending-facts";
import { SentFoot } from "./sent-foot";
import { SentResults } from "./sent-results";
import { StandsSince } from "./stands-since";
import { useRecord } from "./use-record";
import type { RecordScreenState } from "./use-record-screen";
import { wasNowRows } from "./was-now-rows";

interface SentScreenProps {
  screen: RecordScreenState;
  onHeight: () => void;
  onNext: (focus: string | null) => void;
}

/** After Save: kept and on its way, then saved; what changed, what it works out to, what is due, and Undo. */
export function SentScreen({ screen, onHeight, onNext }: SentScreenProps) {
  const { worksheet, failing, now } = useRecord();
  const { flow } = screen;
  // What the record held before this entry: the comparison must not move when the answer comes.
  const [before] = useState<Pick<Worksheet, "mechanics" | "observations">>(worksheet);
  if (!flow.pending) return null;
  return (
    <>
      <PatientHeader worksheet={worksheet} onHeight={onHeight} />
      <NotRefreshed failing={failing && !flow.sending} at={worksheet.at} now={now} timeZone={worksheet.unit.timeZone} />
      <SendingState screen={screen} pending={flow.pending} />
      {!flow.sending && <StandsSince pending={flow.pending} />}
      <div className="flex-1 px-4 py-4 tablet:px-6 desk:px-8">
        <WasNowTable pending={flow.pending} before={before} />
        <SentResults />
      </div>
      <SentFoot screen={screen} pending={flow.pending} onNext={onNext} />
    </>
  );
}

function SendingState({ screen, pending }: { screen: RecordScreenState; pending: Pending }) {
  const { worksheet } = useRecord();
  const { flow } = screen;
  if (flow.sending) {
    return (
      <Banner title="Kept on this device">
        Sending, try {flow.tryNumber}.
        <br />
        Keep this page open.
      </Banner>
    );
  }
  const at = timeOfDay({ at: pending.filled.chartedAt, timeZone: worksheet.unit.timeZone });
  const struck = pending.undo === "done";
  return (
    <section
      role="status"
      className="flex items-center gap-4 border-b border-hair bg-accent-soft px-4 py-4 tablet:px-6 desk:px-8"
    >
      <Check aria-hidden="true" size={28} className="shrink-0 text-accent" />
      <div>
        <h2 className="t-title">{struck ? "Struck through" : "Saved"}</h2>
        <p className="t-body">
          {struck ? `The entry of ${at} no longer counts. It stays readable, struck through.` : `On record for ${at}.`}
        </p>
      </div>
    </section>
  );
}

function WasNowTable({ pending, before }: { pending: Pending; before: Pick<Worksheet, "mechanics" | "observations"> }) {
  const { worksheet } = useRecord();
  const at = timeOfDay({ at: pending.filled.chartedAt, timeZone: worksheet.unit.timeZone });
  const isCheck = pending.entry.route === "settings-checks";
  const rows = wasNowRows(pending, before);
  const charted = pending.entry.route === "bedside-entries" ? pending.entry.body.settings?.mode : undefined;
  const mode = charted ?? (pending.filled.values["mode"] as VentilationMode | null);
  if (isCheck) return <p className="t-strip">Settings checked, unchanged, at {at}.</p>;
  return (
    <div className={pending.undo === "done" ? "line-through decoration-2" : undefined}>
      <table className="w-full max-w-[760px]">
        <thead>
          <tr className="border-b-2 border-ink t-label text-muted">
            <th scope="col" className="py-2 text-left font-normal">
              At {at}
              {mode && `, ${modeLabel(mode)}`}
            </th>
            <th scope="col" className="w-[90px] text-right font-normal">
              was
            </th>
            <th scope="col" className="w-[110px] text-right font-normal">
              now
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ label, unit, was, now }) => (
            <tr key={label} className="rule-row">
              <th scope="row" className="h-12 text-left text-[17px] font-normal">
                <Subscripted text={label} />
                {unit && (
                  <span className="text-muted">
                    , <Subscripted text={unit} />
                  </span>
                )}
              </th>
              <td className="text-right text-muted">
                <Quantity text={was ?? "–"} className="text-[22px]" />
              </td>
              <td className="text-right">
                <Quantity text={now} className="n-row" />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="pt-2 t-label text-muted">All other settings as they were.</p>
    </div>
  );
}
