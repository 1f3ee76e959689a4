"use client";

import { Check } from "lucide-react";
import { TextField } from "@/components/ui/text-field";
import { orderWords } from "./order-words";
import { reasonChoices } from "./record-values";
import { useRecord } from "./use-record";

/** Why a setting leaves the order: never blocked, always said. Nothing is chosen beforehand. */
export function ReasonChoice() {
  const { editing, readiness, worksheet, refused } = useRecord();
  const { values, set } = editing;
  if (readiness.departures.length === 0) return null;
  const choose = (reason: string) => {
    set("ownWords", false);
    set("reason", reason);
  };
  const inOwnWords = () => {
    if (!values.ownWords) set("reason", "");
    set("ownWords", true);
  };
  const refusal = refused.find(({ path }) => path === "reason")?.message;
  return (
    <section aria-label="Reason" className="pb-3">
      <p className="py-1.5 t-body">
        {orderWords(readiness.departures, worksheet)}{" "}
        {readiness.reason ? (
          <span className="text-muted">Reason:</span>
        ) : (
          <b className="font-[640] text-outside">A reason is needed.</b>
        )}
      </p>
      {refusal && (
        <p role="alert" className="pb-1 t-small font-[560] text-outside">
          {refusal}
        </p>
      )}
      <div className="grid grid-cols-2 gap-2 tablet:grid-cols-4">
        {reasonChoices.map((reason) => (
          <Choice
            key={reason}
            words={reason}
            chosen={values.reason === reason && !values.ownWords}
            onChoose={() => choose(reason)}
          />
        ))}
        <Choice words="Own words" chosen={values.ownWords} onChoose={inOwnWords} />
      </div>
      {values.ownWords && (
        <TextField
          label="Reason, in your own words"
          hint={`${200 - values.reason.length} characters left`}
          maxLength={200}
          autoFocus
          value={values.reason}
          onChange={(event) => set("reason", event.target.value)}
          className="pt-2"
        />
      )}
    </section>
  );
}

function Choice({ words, chosen, onChoose }: { words: string; chosen: boolean; onChoose: () => void }) {
  return (
    <button
      type="button"
      aria-pressed={chosen}
      onClick={onChoose}
      className={`flex min-h-14 items-center justify-center gap-2 rounded-[8px] px-2 text-[16px] font-[620] ${chosen ? "border-[2.5px] border-accent bg-accent-soft text-ink" : "control"}`}
    >
      {chosen && <Check aria-hidden="true" size={18} className="text-accent" strokeWidth={3} />}
      {words}
    </button>
  );
}
