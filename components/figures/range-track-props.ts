import type { Limit, State } from "@/lib/protocol/result";
import type { TrackMetric } from "./track-domain";

export interface RangeTrackProps {
  metric: TrackMetric;
  /** What the text alternative calls it ('Plateau'). */
  name: string;
  /** Null where nothing may be read as true now. */
  value: number | null;
  lastValue?: number | null;
  state: State;
  /** 'outside' keeps the diamond, dashed, while the value is not measured. */
  lastState?: State | null;
  limit: Limit;
  /** px; 72 beside what is measured, 104 beside what it works out to, 60 and 78 at 1024. */
  width?: number;
}
