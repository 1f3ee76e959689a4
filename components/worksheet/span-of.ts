import type { LowWater, PressureSpanProps, SpanReading } from "@/components/figures/span-reading";
import type { Derived, Worksheet } from "@/lib/contracts";
import { clockTime, durationText } from "@/lib/format";

/** Beds knows no single readings: there the peak is not drawn. */
type Sheet = Pick<Worksheet, "settings" | "derived"> & {
  mechanics: Worksheet["mechanics"];
  unit: Pick<Worksheet["unit"], "timeZone">;
};

const numberOf = (values: Record<string, { value: unknown }> | null, field: string): number | null => {
  const value = values?.[field]?.value;
  return typeof value === "number" ? value : null;
};

const inputOf = (derived: Derived | undefined, name: string): number | null =>
  derived?.inputs.find((input) => input.name === name)?.value ?? null;

/** The pressure span of a worksheet: what stands, or what last stood and is no longer true. `now` in ms. */
export function spanOf(sheet: Sheet, now: number): Omit<PressureSpanProps, "size"> {
  const mode = sheet.settings?.mode?.value;
  return {
    lowWater: lowWaterOf(sheet, mode),
    reading: readingOf(sheet, mode, now),
    limits: {
      plateau: sheet.derived.plateauCmH2O?.limit?.max ?? null,
      driving: sheet.derived.drivingPressureCmH2O?.limit?.max ?? null,
    },
  };
}

function lowWaterOf(sheet: Sheet, mode: unknown): LowWater | null {
  const driving = sheet.derived.drivingPressureCmH2O;
  const total = driving?.value == null ? null : inputOf(driving, "totalPeepCmH2O");
  if (total !== null) return { value: total, word: "total PEEP" };
  if (mode === "APRV") {
    const low = numberOf(sheet.settings, "pLowCmH2O");
    return low === null ? null : { value: low, word: "P-low" };
  }
  const set = numberOf(sheet.settings, "peepCmH2O");
  return set === null ? null : { value: set, word: "PEEP, set" };
}

function readingOf(sheet: Sheet, mode: unknown, now: number): SpanReading {
  if (mode === "HFOV") return lineOf(sheet, "meanAirwayPressureCmH2O", "mean pressure");
  if (mode === "APRV") return lineOf(sheet, "pHighCmH2O", "P-high");
  if (mode === "HFNO")
    return { kind: "words", words: `high flow ${numberOf(sheet.settings, "flowLPerMin") ?? "?"} L/min` };
  const plateau = sheet.derived.plateauCmH2O;
  if (plateau?.state === "not-asked") return supportOf(sheet);
  return holdOf(sheet, plateau, sheet.derived.drivingPressureCmH2O, now);
}

function lineOf(sheet: Sheet, field: string, word: "mean pressure" | "P-high"): SpanReading {
  const value = numberOf(sheet.settings, field);
  if (value === null) return { kind: "never" };
  return { kind: "line", value, word, state: sheet.derived.plateauCmH2O?.state ?? null };
}

function supportOf(sheet: Sheet): SpanReading {
  const support = numberOf(sheet.settings, "pressureSupportCmH2O");
  return support === null ? { kind: "words", words: "not asked, spontaneous" } : { kind: "support", support };
}

function holdOf(sheet: Sheet, plateau: Derived | undefined, driving: Derived | undefined, now: number): SpanReading {
  if (plateau?.value != null && driving?.value != null) {
    const minutes = plateau.chartedAt ? (now - Date.parse(plateau.chartedAt)) / 60_000 : 0;
    return {
      kind: "measured",
      plateau: plateau.value,
      driving: driving.value,
      plateauState: plateau.state,
      drivingState: driving.state,
      peak: peakOfSameHold(sheet, plateau),
      age: durationText({ minutes }),
    };
  }
  if (plateau?.value != null && plateau.notes.includes("patient-effort")) {
    return { kind: "effort", plateau: plateau.value, peak: peakOfSameHold(sheet, plateau), hold: "effort" };
  }
  if (plateau?.lastValue == null || !plateau.chartedAt) return { kind: "never" };
  const base = inputOf(driving, "totalPeepCmH2O") ?? inputOf(driving, "peepCmH2O");
  return {
    kind: "unmeasured",
    plateau: plateau.lastValue,
    basePeep: base ?? plateau.lastValue - (driving?.lastValue ?? 0),
    driving: driving?.lastValue ?? null,
    peak: peakOfSameHold(sheet, plateau),
    at: clockTime({ at: plateau.chartedAt, now, timeZone: sheet.unit.timeZone }),
    lastOutside: plateau.lastState === "outside" || driving?.lastState === "outside",
  };
}

/** The peak beside a plateau is the one read with it; an older or newer peak would draw a breath that never was. */
function peakOfSameHold(sheet: Sheet, plateau: Derived): number | null {
  const peak = sheet.mechanics?.peakCmH2O;
  if (!peak || typeof peak.value !== "number") return null;
  return Date.parse(peak.chartedAt) === Date.parse(plateau.chartedAt ?? "") ? peak.value : null;
}
