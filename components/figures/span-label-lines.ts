import { pressureText } from "./pressure-text";
import { hasLimitTick } from "./describe-span";
import type { LowWater, PressureSpanProps, SpanLimits, SpanReading } from "./span-reading";
import { stateWord } from "./state-word";

interface LabelLine {
  text: string;
  /** A number in the mono face after the word. */
  number?: string;
  look: "number" | "word" | "quiet" | "age" | "limit" | "unmeasured" | "was" | "inside" | "edge" | "outside";
  /** From the label's top edge, px. */
  baseline: number;
}

export interface SpanLabel {
  part: "peak" | "limit" | "high" | "low";
  /** cmH2O of the line it names. */
  at: number;
  /** Where its top would stand relative to that line, px. */
  offset: number;
  height: number;
  pinned?: boolean;
  lines: LabelLine[];
}

/** All labels of a span, top to bottom. */
export function spanLabels({ lowWater, reading, limits }: PressureSpanProps, pxPerCmH2O: number): SpanLabel[] {
  const limit = hasLimitTick(reading) && limits.plateau !== null ? limitLabel(limits.plateau) : null;
  const high = highLabel(reading, limits);
  const labels = [peakLabel(reading), high, limit, lowWater && lowLabel(lowWater)].filter((label) => label !== null);
  return labels.sort((a, b) => rank(b, limit, pxPerCmH2O) - rank(a, limit, pxPerCmH2O));
}

/** A stack just above the limit reads better below it than pushed a whole stack's height up. */
function rank(label: SpanLabel, limit: SpanLabel | null, pxPerCmH2O: number): number {
  const closeAbove = limit !== null && label.part === "high" && (label.at - limit.at) * pxPerCmH2O < label.height / 2;
  return closeAbove ? Math.min(label.at, limit.at - 0.001) : label.at + (label.part === "peak" ? 0.001 : 0);
}

function limitLabel(at: number): SpanLabel {
  return {
    part: "limit",
    at,
    offset: -10,
    height: 20,
    pinned: true,
    lines: [{ text: "limit", look: "limit", baseline: 15 }],
  };
}

function lowLabel({ value, word }: LowWater): SpanLabel {
  return stack("low", value, [
    { text: pressureText(value), look: "number" },
    { text: word, look: "word" },
  ]);
}

function peakLabel(reading: SpanReading): SpanLabel | null {
  if (!("peak" in reading) || reading.peak == null) return null;
  const number = pressureText(reading.peak);
  if (reading.kind !== "unmeasured") {
    const line = { text: "peak", number, look: "quiet", baseline: 15 } as const;
    return { part: "peak", at: reading.peak, offset: -10, height: 20, lines: [line] };
  }
  return {
    part: "peak",
    at: reading.peak,
    offset: -28,
    height: 38,
    lines: [
      { text: "peak", look: "unmeasured", baseline: 15 },
      { text: `was ${number}`, look: "was", baseline: 33 },
    ],
  };
}

function highLabel(reading: SpanReading, limits: SpanLimits): SpanLabel | null {
  switch (reading.kind) {
    case "measured":
      return stack("high", reading.plateau, [
        { text: pressureText(reading.plateau, limits.plateau), look: "number" },
        { text: "plateau", look: "word" },
        ...stateOrAge(reading),
      ]);
    case "unmeasured":
      return stack("high", reading.plateau, [
        { text: "plateau", look: "unmeasured" },
        { text: `was ${pressureText(reading.plateau, limits.plateau)}`, look: "was" },
        { text: `at ${reading.at}`, look: "was" },
      ]);
    case "draft":
      return stack("high", reading.plateau, [
        { text: pressureText(reading.plateau, limits.plateau), look: "number" },
        { text: "plateau", look: "word" },
        { text: "if relaxed", look: "quiet" },
      ]);
    case "effort":
      return stack("high", reading.plateau, [
        { text: pressureText(reading.plateau, limits.plateau), look: "number" },
        { text: reading.hold === "effort" ? "with effort" : "not sure", look: "word" },
        ...(reading.age ? [{ text: reading.age, look: "age" as const }] : []),
      ]);
    case "line":
      return stack("high", reading.value, [
        { text: pressureText(reading.value, limits.plateau), look: "number" },
        ...reading.word.split(" ").map((text) => ({ text, look: "word" as const })),
        ...(reading.state && reading.state !== "not-asked" && reading.state !== "unmeasured"
          ? [{ text: stateWord(reading.state), look: reading.state }]
          : []),
      ]);
    default:
      return null;
  }
}

function stateOrAge(reading: Extract<SpanReading, { kind: "measured" }>): Omit<LabelLine, "baseline">[] {
  const state = reading.plateauState;
  if (reading.showState && (state === "inside" || state === "edge" || state === "outside")) {
    return [{ text: stateWord(state), look: state }];
  }
  return reading.age ? [{ text: reading.age, look: "age" }] : [];
}

/** Lines under one another, the first below its line on the column. */
function stack(part: "high" | "low", at: number, lines: Omit<LabelLine, "baseline">[]): SpanLabel {
  let baseline = 0;
  const placed = lines.map((line, index) => {
    baseline += index === 0 ? (line.look === "number" ? 26 : 19) : 18;
    return { ...line, baseline };
  });
  return { part, at, offset: 1, height: baseline + 7, lines: placed };
}
