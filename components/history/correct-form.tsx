import { useState, type FormEvent } from "react";
import { TextField } from "@/components/ui/text-field";
import { AppError, replacementSchemaOf, unitOf, wordsOf, type Entry, type Worksheet } from "@/lib/contracts";
import { newClientKey } from "@/lib/client/new-client-key";
import { useCorrectEntry } from "@/lib/client/use-correct-entry";
import { timeOfDay } from "@/lib/format";
import { chartedRanges, type ChartedField } from "@/lib/physiology";
import { correctedEntry, correctedMoment, editableFields } from "./correction-values";
import { FormFoot } from "./form-foot";

interface CorrectFormProps {
  entry: Entry;
  sheet: Worksheet;
  onDone: () => void;
}

type Refusals = Record<string, string>;

/** Replaces an entry by what it should have said. The old one stays readable, struck through. */
export function CorrectForm({ entry, sheet, onDone }: CorrectFormProps) {
  const { timeZone } = sheet.unit;
  const fields = editableFields(entry);
  const [typed, setTyped] = useState(() => Object.fromEntries(fields.map(({ field, text }) => [field, text])));
  const [time, setTime] = useState(() => timeOfDay({ at: entry.chartedAt, timeZone }));
  const [reason, setReason] = useState("");
  const [refusals, setRefusals] = useState<Refusals>({});
  const [clientKey, setClientKey] = useState(newClientKey);
  const correct = useCorrectEntry(sheet.patient.id);
  const send = (event: FormEvent) => {
    event.preventDefault();
    const chartedAt = correctedMoment(entry, time, timeZone);
    if (chartedAt === null) return setRefusals({ time: "A time looks like 14:20." });
    const body = correctedEntry(entry, typed, chartedAt);
    const found = refusalsOf(entry, body);
    setRefusals(found);
    if (Object.keys(found).length > 0) return;
    correct.mutate(
      { entryId: entry.id, body: { clientKey, correction: "replace", reason: reason.trim(), entry: body } },
      {
        onSuccess: onDone,
        onError: (error) => {
          setClientKey(newClientKey());
          setRefusals(serverRefusals(error));
        },
      },
    );
  };
  return (
    <form onSubmit={send} className="space-y-3 pt-2" noValidate>
      {fields.map(({ field }) => (
        <TextLine
          key={field}
          label={labelOf(field)}
          value={typed[field] ?? ""}
          refusal={refusals[field]}
          numeric
          onChange={(text) => setTyped({ ...typed, [field]: text })}
        />
      ))}
      <TextLine label="Time" value={time} refusal={refusals.time ?? refusals.chartedAt} onChange={setTime} />
      <TextLine label="Why is it corrected?" value={reason} refusal={refusals.reason} onChange={setReason} />
      <FormFoot
        verb="Save the correction"
        ready={reason.trim() !== ""}
        sending={correct.isPending}
        tryNumber={correct.tryNumber}
        refusal={correct.error instanceof AppError ? correct.error.message : (refusals[""] ?? null)}
        onCancel={onDone}
      />
    </form>
  );
}

const isCharted = (field: string): field is ChartedField => field in chartedRanges;

function labelOf(field: string): string {
  if (!isCharted(field)) return field;
  const unit = unitOf(field);
  return unit ? `${wordsOf(field)}, ${unit}` : wordsOf(field);
}

function refusalsOf(entry: Entry, body: Record<string, unknown>): Refusals {
  const result = replacementSchemaOf(entry.kind).safeParse(body);
  return Object.fromEntries((result.error?.issues ?? []).map(({ path, message }) => [path.join("."), message]));
}

function serverRefusals(error: unknown): Refusals {
  if (!(error instanceof AppError)) return {};
  return Object.fromEntries(error.errors.map(({ path, message }) => [path.replace(/^entry\./, ""), message]));
}

interface TextLineProps {
  label: string;
  value: string;
  refusal?: string | undefined;
  numeric?: boolean;
  onChange: (text: string) => void;
}

function TextLine({ label, value, refusal, numeric = false, onChange }: TextLineProps) {
  return (
    <TextField
      label={label}
      value={value}
      inputMode={numeric ? "decimal" : "text"}
      onChange={(event) => onChange(event.target.value)}
      {...(refusal && { error: refusal })}
    />
  );
}
