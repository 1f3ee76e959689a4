"use client";

import { Controller, type Control } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { lengthFieldOf, type HeightCheck, type HeightValues } from "./height-body";

const lengthWords = {
  heightCm: "Height, cm",
  ulnaCm: "Ulna, elbow to wrist, cm",
  kneeHeightCm: "Knee height, cm",
  demispanCm: "Demispan, notch to finger web, cm",
};

interface HeightLengthProps {
  control: Control<HeightValues>;
  values: HeightValues;
  check: HeightCheck;
  onFeet: (inFeet: boolean) => void;
}

/** The length that the method measures, in cm; a height also in feet and inches. */
export function HeightLength({ control, values, check, onFeet }: HeightLengthProps) {
  if (!values.method) return null;
  const lengthField = lengthFieldOf(values.method);
  const inFeet = lengthField === "heightCm" && values.inFeet;
  return (
    <div className="flex flex-wrap items-end gap-3">
      {inFeet ? (
        <>
          <Length control={control} name="feet" label="Feet" />
          <Length control={control} name="inches" label="Inches" />
        </>
      ) : (
        <Length control={control} name="length" label={lengthWords[lengthField]} />
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

interface LengthProps {
  control: Control<HeightValues>;
  name: "length" | "feet" | "inches";
  label: string;
}

function Length({ control, name, label }: LengthProps) {
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
