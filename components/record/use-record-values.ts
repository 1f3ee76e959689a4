"use client";

import { useCallback, useState } from "react";
import { useForm, useWatch, type FieldPath, type FieldPathValue } from "react-hook-form";
import type { Filled } from "./filled";
import { emptyRecord, type RecordValues } from "./record-values";

export type SetRecordValue = <Name extends FieldPath<RecordValues>>(
  name: Name,
  value: FieldPathValue<RecordValues, Name>,
) => void;

export interface RecordEditing {
  values: RecordValues;
  filled: Filled;
  /** Something has been put in: the time and what the form was filled with stand still from then on. */
  begun: boolean;
  set: SetRecordValue;
  /** Fills the form anew, for another time; what was typed stays. */
  refill: (filled: Filled) => void;
  restore: (values: RecordValues, filled: Filled) => void;
  clear: () => void;
}

/** What a person has put in over what the form was filled with. Until the first touch the filling follows the record. */
export function useRecordValues(latest: Filled): RecordEditing {
  const { control, reset, setValue } = useForm<RecordValues>({ defaultValues: emptyRecord });
  const values = useWatch({ control }) as RecordValues;
  const [frozen, setFrozen] = useState<Filled | null>(null);
  const set: SetRecordValue = useCallback(
    (name, value) => {
      setFrozen((held) => held ?? latest);
      setValue(name, value, { shouldDirty: true });
    },
    [latest, setValue],
  );
  const restore = useCallback(
    (kept: RecordValues, filled: Filled) => {
      setFrozen(filled);
      reset(kept, { keepDefaultValues: true });
    },
    [reset],
  );
  const clear = useCallback(() => {
    setFrozen(null);
    reset(emptyRecord);
  }, [reset]);
  return { values, filled: frozen ?? latest, begun: frozen !== null, set, refill: setFrozen, restore, clear };
}
