import type { NoteCode } from "../note-codes";
import type { FactBase } from "../facts";
import type { Item } from "../timeline/item";

/** One charted value that went into a number; `item` is the fact that holds it. */
export interface Input {
  name: string;
  value: number | null;
  unit: string;
  item: Item<FactBase> | null;
}

export interface Alternative {
  value: number | null;
  item: Item<FactBase> | null;
  note: NoteCode;
}

/** One reading of a metric, before it is judged. */
export interface Reading {
  t: number;
  item: Item<FactBase>;
  /** Null when an input is missing or the number cannot be computed (V14), or when it is never read from this (V8). */
  value: number | null;
  /** V8: a hold that may have met effort: the number it showed, of which only *above the limit* is believed. */
  effort?: boolean;
  /** The number seen, where it is withheld. */
  seen?: number | null;
  notes?: NoteCode[];
  inputs: Input[];
  alternatives?: Alternative[];
  band?: string;
  /** S5: FiO2 at the reading, typed first. */
  fio2Percent?: number | null;
}
