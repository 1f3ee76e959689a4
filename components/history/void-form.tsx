import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
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
      <TextField
        label="Why is it voided?"
        value={reason}
        maxLength={200}
        autoFocus
        onChange={(event) => setReason(event.target.value)}
      />
      <p className="flex flex-wrap gap-2">
        {usualReasons.map((each) => (
          <Button key={each} onClick={() => setReason(each)}>
            {each}
          </Button>
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
