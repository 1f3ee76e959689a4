import { pressureText } from "./pressure-text";
import { stateWord } from "./state-word";
import type { PressureSpanMiniProps, SpanLimits, SpanReading } from "./span-reading";
import type { State } from "@/lib/protocol/result";

/** The same as the drawing, as sentences. Both spans carry it as their text alternative. */
export function describeSpan({ lowWater, reading, limits }: Omit<PressureSpanMiniProps, "size">): string {
  const low = lowWater && `${lowWater.word.replace("PEEP, set", "set PEEP")} ${pressureText(lowWater.value)}`;
  const parts = [low, ...readingWords(reading, limits), ...limitWords(reading, limits)].filter((part) => part !== null);
  return `Pressure span, cmH2O: ${parts.join("; ")}.`;
}

function readingWords(reading: SpanReading, limits: SpanLimits): (string | null)[] {
  switch (reading.kind) {
    case "measured":
      return [
        judged(`plateau ${pressureText(reading.plateau, limits.plateau)}`, reading.plateauState),
        judged(`driving pressure ${pressureText(reading.driving, limits.driving)}`, reading.drivingState),
        peakWords(reading.peak),
        reading.age ? `hold ${reading.age} ago` : null,
      ];
    case "unmeasured":
      return [
        reading.lastOutside
          ? `outside at ${reading.at}, not measured since`
          : "plateau and driving pressure not measured",
        `at ${reading.at} plateau was ${pressureText(reading.plateau, limits.plateau)}`,
        reading.driving === null ? null : `driving pressure was ${pressureText(reading.driving, limits.driving)}`,
        reading.peak == null ? null : `peak was ${pressureText(reading.peak)}`,
      ];
    case "draft":
      return [
        `plateau ${pressureText(reading.plateau, limits.plateau)} if relaxed, say how the hold was`,
        peakWords(reading.peak),
      ];
    case "effort":
      return [
        `plateau ${pressureText(reading.plateau, limits.plateau)}${isAbove(reading.plateau, limits.plateau) ? ", outside" : ""}`,
        `${reading.hold === "effort" ? "patient effort" : "hold not sure"}, repeat relaxed: driving pressure not measured`,
        peakWords(reading.peak),
        reading.age ? `hold ${reading.age} ago` : null,
      ];
    case "never":
      return ["no plateau yet"];
    case "support":
      return [`pressure support ${pressureText(reading.support)}`];
    case "line":
      return [judged(`${reading.word} ${pressureText(reading.value, limits.plateau)}`, reading.state ?? null)];
    case "words":
      return [reading.words];
  }
}

function limitWords(reading: SpanReading, limits: SpanLimits): (string | null)[] {
  if (!hasLimitTick(reading)) return [];
  return [
    limits.plateau === null ? null : `plateau limit ${pressureText(limits.plateau)}`,
    limits.driving === null || reading.kind === "line"
      ? null
      : `driving pressure limit ${pressureText(limits.driving)}`,
  ];
}

/** The plateau limit is drawn and spoken wherever a plateau, or P-high in its place, is held against it. */
export function hasLimitTick(reading: SpanReading): boolean {
  if (reading.kind === "line") return reading.word === "P-high";
  return reading.kind !== "support" && reading.kind !== "words";
}

function judged(words: string, state: State | null): string {
  return state === null ? words : `${words}, ${stateWord(state)}`;
}

function peakWords(peak?: number | null): string | null {
  return peak == null ? null : `peak ${pressureText(peak)}`;
}

function isAbove(value: number, limit: number | null): boolean {
  return limit !== null && value - limit > 1e-6;
}
