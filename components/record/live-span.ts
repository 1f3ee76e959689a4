import type { PressureSpanProps } from "@/components/figures/span-reading";
import { spanOf } from "@/components/worksheet/span-of";
import type { LiveResult } from "./live-result";

/** The pressure span while a person types: a plateau whose hold has no word yet is hatched. */
export function liveSpan(live: LiveResult, now: number): Omit<PressureSpanProps, "size"> {
  const span = spanOf(live.sheet, now);
  const { reading } = span;
  if (reading.kind !== "measured") return span;
  if (live.ifRelaxed)
    return { ...span, reading: { kind: "draft", plateau: reading.plateau, peak: reading.peak ?? null } };
  return { ...span, reading: { ...reading, showState: true } };
}
