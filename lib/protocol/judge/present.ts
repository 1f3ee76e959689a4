import { isoOf } from "../instant";
import type { Derived, DerivedInput } from "../result";
import type { Scene } from "../scene";
import { writtenTimes } from "../timeline/item";
import type { Judged } from "./judged";
import type { Input } from "./reading";

function presentInput({ name, value, unit, item }: Input): DerivedInput {
  if (!item) return { name, value, unit, entryId: null, chartedAt: null, recordedAt: null, author: null };
  const { chartedAt, recordedAt } = writtenTimes(item);
  return { name, value, unit, entryId: item.fact.id, chartedAt, recordedAt, author: item.fact.author };
}

/** A judged metric in the answer's shape. `inputs` are those of the value, else of the last one. */
export function present(scene: Scene, judged: Judged): Derived {
  const { reading, last, change, limit } = judged;
  const shown = reading ?? last;
  return {
    value: reading?.value ?? null,
    lastValue: last ? (last.value ?? last.seen ?? null) : null,
    lastState: judged.lastState,
    unit: judged.unit,
    state: judged.state,
    freshness: judged.freshness,
    changedAt: isoOf(change?.t),
    changedByEntryId: change?.entryId ?? null,
    changedBy: change?.by ?? null,
    dueAt: isoOf(judged.dueAt),
    chartedAt: shown ? writtenTimes(shown.item).chartedAt : null,
    since: isoOf(judged.run?.since),
    limit: limit && { ...bounds(limit), origin: scene.targets.origin ?? "order" },
    ...(shown?.band === undefined ? {} : { band: shown.band }),
    notes: judged.notes,
    alternatives: judged.alternatives.map(({ value, item, note }) => ({
      value,
      note,
      chartedAt: isoOf(item?.t),
      entryId: item?.fact.id ?? null,
    })),
    inputs: shown?.inputs.map(presentInput) ?? [],
    source: judged.source,
  };
}

function bounds({ min, max }: { min?: number | null; max?: number | null }): { min?: number; max?: number } {
  return {
    ...(min === null || min === undefined ? {} : { min }),
    ...(max === null || max === undefined ? {} : { max }),
  };
}
