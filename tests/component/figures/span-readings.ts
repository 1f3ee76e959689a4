import type { PressureSpanMiniProps, SpanReading } from "@/components/figures/span-reading";

type Span = Omit<PressureSpanMiniProps, "size">;

export const ordered = { plateau: 30, driving: 15 };

export function span(reading: SpanReading, others: Partial<Span> = {}): Span {
  return { lowWater: { value: 12, word: "total PEEP" }, limits: ordered, reading, ...others };
}

export function measured(others: Partial<Extract<SpanReading, { kind: "measured" }>> = {}): SpanReading {
  return {
    kind: "measured",
    plateau: 24,
    driving: 12,
    plateauState: "inside",
    drivingState: "inside",
    peak: 31,
    age: "2 h 10",
    ...others,
  };
}

export function unmeasured(others: Partial<Extract<SpanReading, { kind: "unmeasured" }>> = {}): SpanReading {
  return {
    kind: "unmeasured",
    plateau: 26,
    basePeep: 12,
    driving: 14,
    peak: 33,
    at: "22:15",
    lastOutside: false,
    ...others,
  };
}
