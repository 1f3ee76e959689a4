import { useState, type FormEvent } from "react";
import { AppError, type Entry } from "@/lib/contracts";
import { newClientKey } from "@/lib/client/new-client-key";
import { useCorrectEntry } from "@/lib/client/use-correct-entry";
import { FormFoot } from "./form-foot";

const usualReasons = ["Wrong patient", "Wrong reading"];

/** Strikes an entry without replacing it. It needs a reason, and stays readable. */
export function VoidForm({ entry, patientId, onDone }: { entry: Entry; patientId: string; onDone: () => void }) {
  const [reason, setReason] = useState("");
  const [clientKey, setClientKey] = useState(newClientKey);
  const correct = useCorrectEntry(patientId);
  const send = (event: FormEvent) => {
    event.preventDefault();
    correct.mutate(
      { entryId: entry.id, body: { clientKey, correction: "void", reason: reason.trim() } },
      { onSuccess: onDone, onError: () => setClientKey(newClientKey()) },
    );
  };
  return (
    <form onSubmit={send} className="space-y-3 pt-2">
      <label className="block t-label">
        Why is it voided?
        <input
          className="mt-1 h-[48px] w-full rounded-[6px] px-3 control t-body"
          value={reason}
          maxLength={200}
          required
          autoFocus
          onChange={(event) => setReason(event.target.value)}
        />
      </label>
      <p className="flex flex-wrap gap-2">
        {usualReasons.map((each) => (
          <button
            key={each}
            type="button"
            className="min-h-[44px] rounded-[6px] px-3 control t-state"
            onClick={() => setReason(each)}
          >
            {each}
          </button>
        ))}
      </p>
      <FormFoot
        verb="Void this entry"
        ready={reason.trim() !== ""}
        sending={correct.isPending}
        tryNumber={correct.tryNumber}
        refusal={correct.error instanceof AppError ? correct.error.message : null}
        onCancel={onDone}
      />
    </form>
  );
}
