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
        <p role="status" className="text-unm t-small">
          Kept on this device. Sending, try {tryNumber}. Keep this page open.
        </p>
      )}
      <p className="flex gap-2">
        <button
          type="submit"
          disabled={!ready || sending}
          className="min-h-[48px] rounded-[6px] border-[1.5px] border-accent bg-accent px-4 text-on-accent t-state disabled:border-dashed disabled:border-rule disabled:bg-transparent disabled:text-muted"
        >
          {sending ? "Sending" : verb}
        </button>
        <button type="button" className="min-h-[48px] rounded-[6px] px-4 control t-state" onClick={onCancel}>
          Cancel
        </button>
      </p>
    </>
  );
}
