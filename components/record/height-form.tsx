"use client";

import { Controller, useForm, useWatch, type Control } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { ErrorNote } from "@/components/ui/error-note";
import { TextField } from "@/components/ui/text-field";
import { heightWords } from "@/components/worksheet/height-words";
import { heightMethods, type HeightMethod } from "@/lib/contracts";
import { calendarDate, displayNumber } from "@/lib/format";
import { ChoiceRow } from "./choice-row";
import { checkHeight, emptyHeight, lengthFieldOf, type HeightCheck, type HeightValues } from "./height-body";
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

const lengthWords = {
  heightCm: "Height, cm",
  ulnaCm: "Ulna, elbow to wrist, cm",
  kneeHeightCm: "Knee height, cm",
  demispanCm: "Demispan, notch to finger web, cm",
};

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
  return (
    <form onSubmit={(event) => void submit(event)} className="flex flex-col gap-4 pb-6" noValidate>
      <p className="t-body">
        <b>{patient.name}</b>, {calendarDate(patient.birthDate)}, MRN {patient.mrn}
        {height && `. Now ${height.heightCm} cm, ${heightWords[height.method].short}.`}
      </p>
      <Controller
        control={control}
        name="method"
        render={({ field }) => (
          <ChoiceRow
            label="How it was got, best first"
            columns={1}
            choices={heightMethods.map((value) => ({ value, words: methodWords[value] }))}
            value={field.value}
            onChange={field.onChange}
          />
        )}
      />
      {values.method && (
        <Length control={control} values={values} check={check} onFeet={(feet) => setValue("inFeet", feet)} />
      )}
      <Controller
        control={control}
        name="sex"
        render={({ field }) => (
          <ChoiceRow
            label="Sex used for PBW"
            columns={2}
            choices={[
              { value: "male", words: "Male" },
              { value: "female", words: "Female" },
            ]}
            value={field.value}
            onChange={field.onChange}
          />
        )}
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
        <Controller
          control={control}
          name="reason"
          render={({ field }) => (
            <TextField
              label={`Why does this replace the height ${height ? heightWords[height.method].short : ""}?`}
              hint="A lower method replaces a better one only with a reason."
              maxLength={200}
              {...field}
            />
          )}
        />
      )}
      <WorksOutTo check={check} values={values} />
      {(saving.problem ?? (saving.said ? check.blocker : null)) && (
        <ErrorNote>{saving.problem ?? check.blocker}</ErrorNote>
      )}
      <Button type="submit" size="save" look={check.blocker ? "dashed" : "primary"} disabled={saving.sending}>
        {saving.sending ? `Sending, try ${saving.tryNumber}. Keep this page open.` : "Save height"}
      </Button>
    </form>
  );
}

interface LengthProps {
  control: Control<HeightValues>;
  values: HeightValues;
  check: HeightCheck;
  onFeet: (inFeet: boolean) => void;
}

function Length({ control, values, check, onFeet }: LengthProps) {
  if (!values.method) return null;
  const lengthField = lengthFieldOf(values.method);
  const inFeet = lengthField === "heightCm" && values.inFeet;
  return (
    <div className="flex flex-wrap items-end gap-3">
      {inFeet ? (
        <>
          <LengthField control={control} name="feet" label="Feet" />
          <LengthField control={control} name="inches" label="Inches" />
        </>
      ) : (
        <LengthField control={control} name="length" label={lengthWords[lengthField]} />
      )}
      {lengthField === "heightCm" && (
        <Button size="entry" onClick={() => onFeet(!inFeet)}>
          {inFeet ? "in cm" : "in ft and in"}
        </Button>
      )}
      {check.refusal && (
        <p role="alert" className="w-full t-small font-[560] text-outside">
          {check.refusal}
        </p>
      )}
    </div>
  );
}

function LengthField({
  control,
  name,
  label,
}: Pick<LengthProps, "control"> & { name: "length" | "feet" | "inches"; label: string }) {
  return (
    <Controller
      control={control}
      name={name}
      render={({ field }) => (
        <TextField label={label} inputMode="decimal" autoComplete="off" className="min-w-[110px] flex-1" {...field} />
      )}
    />
  );
}

function WorksOutTo({ check, values }: { check: HeightCheck; values: HeightValues }) {
  if (check.heightCm === null || !values.method) return null;
  const estimated = heightWords[values.method].estimated;
  const height = `${displayNumber({ value: check.heightCm, decimals: 1 })} cm`;
  return (
    <p role="status" className="t-body">
      {estimated ? `Estimated height ${height}` : `Height ${height}`}
      {check.pbwKg !== null
        ? `: PBW ${displayNumber({ value: check.pbwKg, decimals: 1 })} kg.`
        : ": no PBW under 120 cm, volume is ordered in mL."}
      {check.heightCm < 152.4 && check.pbwKg !== null && " Below 152.4 cm the line is extrapolated."}
    </p>
  );
}
