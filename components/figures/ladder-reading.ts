import type { Limit, State } from "@/lib/protocol/result";

/** The volume that the marker shows. */
export interface LadderReading {
  tidalVolumeMl: number;
  mlPerKg: number;
  state: State;
  /** Marks a volume judged as set, where an exhaled one would count too: the flag says '390 mL set'. */
  set?: boolean;
}

export interface VolumeLadderProps {
  /** 1440 (108 tall), 1024 (90 tall), or the phone (80 tall, no flag). */
  size?: "full" | "compact" | "phone";
  /** Null: no height, so no ladder. */
  pbwKg: number | null;
  /** Ordered mL/kg; null where nothing is ordered in mL/kg. */
  order: Limit | null;
  reading: LadderReading | null;
  /** A sentence beside the flag: on which volume it is judged, and why on that alone. */
  note?: string;
}

/** Linear over 4 to 12 mL/kg; a marker beyond stops at the rail's end. */
export const ladderEnds = { from: 4, to: 12 };

/** Where a volume stands between the ends, 0 to 1. */
export function alongLadder(mlPerKg: number): number {
  const share = (mlPerKg - ladderEnds.from) / (ladderEnds.to - ladderEnds.from);
  return Math.min(Math.max(share, 0), 1);
}
