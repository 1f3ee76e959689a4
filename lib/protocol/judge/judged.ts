import type { NoteCode } from "../note-codes";
import type { DerivedName, FreshnessWord, State } from "../result";
import type { Range } from "../targets";
import type { Change } from "../timeline/change-kinds";
import type { Alternative, Reading } from "./reading";

/** The unbroken run of outside readings that ends with the newest judged one. */
export interface OutsideRun {
  since: number;
  /** A3: when the record first held it; milliseconds. */
  recordedFrom: number;
}

/** A reading judged outside; `starts` where the one judged before it was not. */
export interface Excursion {
  t: number;
  recordedAt: number;
  value: number;
  starts: boolean;
}

/** A metric judged, with moments still as milliseconds; `present` makes a `Derived` of it. */
export interface Judged {
  name: DerivedName;
  unit: string;
  source: string;
  limit: Range | null;
  state: State | null;
  freshness: FreshnessWord;
  change: Change | null;
  dueAt: number | null;
  /** The reading whose value may be read as true now. */
  reading: Reading | null;
  /** The newest that could be judged (F9). */
  last: Reading | null;
  lastState: State | null;
  run: OutsideRun | null;
  notes: NoteCode[];
  alternatives: Alternative[];
  /** A2: what went outside after a moment; worked out only where an acknowledgement asks. */
  excursionsAfter(t: number): Excursion[];
}

/** Name, unit and published source of a metric. */
export type Named = Pick<Judged, "name" | "unit" | "source">;

/** What was never measured. */
export function missing(named: Named, limit: Range | null, dueAt: number | null = null): Judged {
  return {
    name: named.name,
    unit: named.unit,
    source: named.source,
    limit,
    state: limit ? "unmeasured" : null,
    freshness: "missing",
    change: null,
    dueAt,
    reading: null,
    last: null,
    lastState: null,
    run: null,
    notes: [],
    alternatives: [],
    excursionsAfter: () => [],
  };
}

/** V9, V10, V11: what the mode, ECMO or comfort does not ask keeps its numbers, but is neither judged nor due. */
export function notAsked(judged: Judged): Judged {
  return { ...judged, state: "not-asked", dueAt: null };
}

/** F7: last outside, and no fresh value inside since. */
export function isHeldOutside(judged: Judged): boolean {
  return judged.lastState === "outside" && judged.state !== "outside" && judged.state !== "not-asked";
}
