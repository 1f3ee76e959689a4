import { Button } from "@/components/ui/button";

interface FormFootProps {
  verb: string;
  ready: boolean;
  sending: boolean;
  tryNumber: number;
  /** A sentence from the server, or null. */
  refusal: string | null;
  onCancel: () => void;
}

/** The end of a small form: what went wrong, what is being sent, the verb and the way back. */
export function FormFoot({ verb, ready, sending, tryNumber, refusal, onCancel }: FormFootProps) {
  return (
    <>
      {refusal && (
        <p role="alert" className="border-l-[3px] border-outside pl-2 t-small">
          {refusal}
        </p>
      )}
      {sending && tryNumber > 1 && (
        <p role="status" className="t-small text-unm">
          Kept on this device. Sending, try {tryNumber}. Keep this page open.
        </p>
      )}
      <p className="flex gap-2">
        <Button type="submit" look={ready && !sending ? "primary" : "dashed"} size="bar" disabled={!ready || sending}>
          {sending ? "Sending" : verb}
        </Button>
        <Button size="bar" onClick={onCancel}>
          Cancel
        </Button>
      </p>
    </>
  );
}
