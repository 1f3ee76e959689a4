import type { State } from "@/lib/protocol/result";

/** All pressures in cmH2O; ages and clock times are words already, in the unit's zone. */
export interface LowWater {
  value: number;
  /** Which pressure the bar stands on. */
  word: "total PEEP" | "PEEP, set" | "P-low";
}

/** What stands on the low water: one of these, never a mixture. */
export type SpanReading =
  | MeasuredSpan
  | UnmeasuredSpan
  | DraftSpan
  | EffortSpan
  /** Nothing has been held since the episode began. */
  | { kind: "never" }
  /** Pressure support: an outline, no limit mark, no driving pressure. */
  | { kind: "support"; support: number }
  /** HFOV's mean pressure or APRV's P-high: one line, no bar, no driving pressure. */
  | { kind: "line"; value: number; word: "mean pressure" | "P-high"; state?: State | null }
  /** Nothing to draw: the words alone ('high flow 45 L/min'). */
  | { kind: "words"; words: string };

interface MeasuredSpan {
  kind: "measured";
  plateau: number;
  driving: number;
  plateauState: State | null;
  drivingState: State | null;
  peak?: number | null;
  /** Age of the hold ('2 h 10'). */
  age?: string;
  /** Draws the plateau's state word in the age's place, as the record form does. */
  showState?: boolean;
}

/** The last hold, when it is no longer true. It stays where it was measured. */
interface UnmeasuredSpan {
  kind: "unmeasured";
  plateau: number;
  /** PEEP under the plateau at the hold; the set PEEP may have moved since. */
  basePeep: number;
  driving: number | null;
  peak?: number | null;
  /** 'HH:MM' of the hold. */
  at: string;
  /** Whether plateau or driving pressure was last outside: the overhang stays, dashed. */
  lastOutside: boolean;
}

/** A plateau just typed, before the person says how the hold was. */
interface DraftSpan {
  kind: "draft";
  plateau: number;
  peak?: number | null;
}

/** A hold with effort, or not sure: no driving pressure comes from it. */
interface EffortSpan {
  kind: "effort";
  plateau: number;
  peak?: number | null;
  hold: "effort" | "unsure";
  age?: string;
}

/** Ordered upper limits; null where the order names none. */
export interface SpanLimits {
  plateau: number | null;
  driving: number | null;
}

export interface PressureSpanProps {
  /** 1440 (212 wide), 1024 (196 wide) or the phone (6 px per cmH2O). */
  size?: "large" | "medium" | "phone";
  /** Null where the mode has no PEEP (HFOV) or none is charted. */
  lowWater: LowWater | null;
  reading: SpanReading;
  limits: SpanLimits;
}

export interface PressureSpanMiniProps {
  size?: "row" | "phone";
  lowWater: LowWater | null;
  reading: SpanReading;
  limits: SpanLimits;
}
