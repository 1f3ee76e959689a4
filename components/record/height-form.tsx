"use client";

import { useForm, useWatch } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { ErrorNote } from "@/components/ui/error-note";
import { TextField } from "@/components/ui/text-field";
import { heightWords } from "@/components/worksheet/height-words";
import { heightMethods, type HeightMethod } from "@/lib/contracts";
import { calendarDate } from "@/lib/format";
import { ChoiceRow } from "./choice-row";
import { checkHeight, emptyHeight, type HeightValues } from "./height-body";
import { HeightLength } from "./height-length";
import { HeightWorksOut } from "./height-works-out";
import { useRecord } from "./use-record";
import { useSaveHeight } from "./use-save-height";

const methodWords: Record<HeightMethod, string> = {
  "measured-standing": "Measured standing",
  "measured-lying": "Measured lying, by tape",
  document: "From a document",
  ulna: "Estimated from the ulna",
  "knee-height": "Estimated from knee height",
  demispan: "Estimated from the demispan",
  reported: "Reported by the patient or family",
};

const methods = heightMethods.map((value) => ({ value, words: methodWords[value] }));
const sexes = [
  { value: "male", words: "Male" },
  { value: "female", words: "Female" },
] as const;

/** Method, length and the sex used for PBW; nothing is guessed, and a lower method says why. */
export function HeightForm({ onDone }: { onDone: () => void }) {
  const { worksheet } = useRecord();
  const { patient, height } = worksheet;
  const defaultValues: HeightValues = { ...emptyHeight, sex: height?.sexForPbw ?? null };
  const { control, setValue, handleSubmit } = useForm<HeightValues>({ defaultValues });
  const values = useWatch({ control }) as HeightValues;
  const check = checkHeight(values, { ageYears: patient.ageYears, standing: height?.method ?? null });
  const saving = useSaveHeight(onDone);
  const submit = handleSubmit((typed) => saving.save(typed, check));
  const said = saving.problem ?? (saving.said ? check.blocker : null);
  return (
    <form onSubmit={(event) => void submit(event)} className="flex flex-col gap-4 pb-6" noValidate>
      <p className="t-body">
        <b>{patient.name}</b>, {calendarDate(patient.birthDate)}, MRN {patient.mrn}
        {height && `. Now ${height.heightCm} cm, ${heightWords[height.method].short}.`}
      </p>
      <ChoiceRow
        label="How it was got, best first"
        columns={1}
        choices={methods}
        value={values.method}
        onChange={(method) => setValue("method", method)}
      />
      <HeightLength control={control} values={values} check={check} onFeet={(inFeet) => setValue("inFeet", inFeet)} />
      <ChoiceRow
        label="Sex used for PBW"
        columns={2}
        choices={sexes}
        value={values.sex}
        onChange={(sex) => setValue("sex", sex)}
      />
      {check.asks && !values.confirmed && (
        <div role="group" aria-label="To confirm" className="flex flex-wrap items-center gap-3">
          <p className="flex-1 t-body font-[560]">{check.asks}</p>
          <Button size="entry" onClick={() => setValue("confirmed", true)}>
            Yes, that is right
          </Button>
        </div>
      )}
      {check.asksReason && (
        <TextField
          label={`Why does this replace the height ${height ? heightWords[height.method].short : ""}?`}
          hint="A lower method replaces a better one only with a reason."
          maxLength={200}
          value={values.reason}
          onChange={(event) => setValue("reason", event.target.value)}
        />
      )}
      <HeightWorksOut check={check} values={values} />
      {said && <ErrorNote>{said}</ErrorNote>}
      <Button type="submit" size="save" look={check.blocker ? "dashed" : "primary"} disabled={saving.sending}>
        {saving.sending ? `Sending, try ${saving.tryNumber}. Keep this page open.` : "Save height"}
      </Button>
    </form>
  );
}
