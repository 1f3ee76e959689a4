import type { Derived, Value, Worksheet } from "@/lib/contracts";
import { evaluate } from "@/lib/protocol";
import type { Evaluation } from "@/lib/protocol/result";
import { coreInputOf } from "./core-input";
import { draftId, withEntry } from "./draft-facts";
import { bedsideEntry } from "./entry-body";
import type { Filled } from "./filled";
import type { RecordValues } from "./record-values";
import { refusalKey, type Refusals } from "./refusals";

/** A worksheet as it would read with the form's entry charted: what the figures draw from while a person types. */
type LiveSheet = Pick<Worksheet, "settings" | "mechanics" | "derived" | "targets" | "unit" | "pbwKg" | "measured">;

export interface LiveResult {
  sheet: LiveSheet;
  evaluation: Evaluation;
  volume: Derived | undefined;
  driving: Derived | undefined;
  /** A plateau stands without its hold's word: the result holds only if the patient was relaxed. */
  ifRelaxed: boolean;
}

interface Typed {
  worksheet: Worksheet;
  values: RecordValues;
  filled: Filled;
  refusals: Refusals;
}

function entryOf({ values, filled, refusals }: Typed) {
  const entry = bedsideEntry(values, filled, { clientKey: draftId, reason: null });
  if (!entry?.mechanics) return entry;
  const kept = Object.entries(entry.mechanics).filter(([field]) => !refusals[refusalKey("mechanics", field)]);
  const mechanics = Object.fromEntries(kept) as NonNullable<typeof entry.mechanics>;
  const plateauAlone = mechanics.plateauCmH2O !== undefined && mechanics.hold === undefined;
  return { ...entry, mechanics: plateauAlone ? { ...mechanics, hold: "relaxed" as const } : mechanics };
}

function drafted(fields: object | undefined, at: string): Record<string, Value> {
  const of = (value: Value["value"]): Value => ({
    value,
    entryId: draftId,
    chartedAt: at,
    recordedAt: at,
    author: { id: draftId, name: "" },
  });
  return Object.fromEntries(Object.entries(fields ?? {}).map(([field, value]) => [field, of(value as Value["value"])]));
}

/** Runs the core over the record plus what is being typed, at the form's time. */
export function liveResult(typed: Typed): LiveResult {
  const { worksheet, values, filled } = typed;
  const core = coreInputOf(worksheet);
  const entry = entryOf(typed);
  const facts = entry ? withEntry(core.facts, entry) : core.facts;
  const evaluation = evaluate({ ...core, facts, at: filled.chartedAt });
  const shown = Object.fromEntries(Object.entries(filled.values).filter(([, value]) => value !== null));
  const settings = { ...shown, ...entry?.settings };
  const sheet: LiveSheet = {
    settings: drafted(settings, filled.chartedAt),
    mechanics: { ...worksheet.mechanics, ...drafted(entry?.mechanics, filled.chartedAt) },
    derived: evaluation.derived,
    targets: worksheet.targets,
    unit: worksheet.unit,
    pbwKg: worksheet.pbwKg,
    measured: {},
  };
  return {
    sheet,
    evaluation,
    volume: evaluation.derived.vtMlPerKg,
    driving: evaluation.derived.drivingPressureCmH2O,
    ifRelaxed: entry?.mechanics?.plateauCmH2O !== undefined && values.hold === null,
  };
}
