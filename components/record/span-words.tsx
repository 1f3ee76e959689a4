"use client";

import { displayNumber } from "@/lib/format";
import { useRecord } from "./use-record";

const write = (value: number) => displayNumber({ value, decimals: Number.isInteger(value) ? 0 : 1 });

/** The subtraction behind the driving pressure, and what it takes for granted. */
export function SpanWords() {
  const { driving } = useRecord().live;
  if (driving?.value == null) return null;
  const input = (name: string) => driving.inputs.find((each) => each.name === name)?.value ?? null;
  const plateau = input("plateauCmH2O");
  const total = input("totalPeepCmH2O");
  const set = input("peepCmH2O");
  if (plateau === null || (total === null && set === null)) return null;
  return (
    <p className="pt-3 t-label text-muted">
      {total === null
        ? `${write(plateau)} − ${write(set ?? 0)}, the set PEEP: assumes no trapped gas`
        : `${write(plateau)} − ${write(total)}, total PEEP of the same reading`}
    </p>
  );
}
