"use client";

import { useCallback, useState } from "react";
import { useForm, useWatch, type FieldPath, type FieldPathValue } from "react-hook-form";
import type { Filled } from "./filled";
import { emptyRecord, type RecordValues } from "./record-values";

type SetRecordValue = <Name extends FieldPath<RecordValues>>(
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

interface Filling {
  /** The filling of this rendering; until the first touch it follows the record and the clock. */
  shown: Filled;
  /** The filling at the very moment of the first touch. */
  fillNow: () => Filled;
  onEdit: () => void;
}

/** What a person has put in over what the form was filled with. */
export function useRecordValues({ shown, fillNow, onEdit }: Filling): RecordEditing {
  const { control, reset, setValue } = useForm<RecordValues>({ defaultValues: emptyRecord });
  const values = useWatch({ control }) as RecordValues;
  const [frozen, setFrozen] = useState<Filled | null>(null);
  const set: SetRecordValue = (name, value) => {
    setFrozen((held) => held ?? fillNow());
    setValue(name, value, { shouldDirty: true });
    onEdit();
  };
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
  return { values, filled: frozen ?? shown, begun: frozen !== null, set, refill: setFrozen, restore, clear };
}
