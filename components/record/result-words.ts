import type { Derived } from "@/lib/contracts";
import { displayNumber, timeOfDay } from "@/lib/format";
import type { State } from "@/lib/protocol/result";

/** A worked-out number as it is written: itself, or what it was and why it may not be read as true now. */
export interface ResultWords {
  number: string | null;
  unit: string;
  state: State | null;
  was: string | null;
  /** 'since 14:20', 'hold at 10:30', 'needs height'. */
  aside: string | null;
  /** Last outside and not measured since: 'HH:MM' of that value. */
  lastOutsideAt: string | null;
}

interface Told {
  unit: string;
  decimals: number;
  timeZone: string;
  /** What is missing where nothing was ever worked out. */
  needs: string;
  /** Beside 'not asked': why. */
  whyNotAsked: string | null;
}

function written(value: number, derived: Derived, decimals: number): string {
  const limits = [derived.limit?.min, derived.limit?.max].filter((limit) => limit !== undefined);
  const whole = Math.abs(value - Math.round(value)) < 1e-6;
  return displayNumber({
    value,
    decimals: whole ? decimals : Math.max(decimals, 1),
    limit: derived.state === "edge" ? [] : limits,
  });
}

function asideOf(derived: Derived, { timeZone, needs, whyNotAsked }: Told): string | null {
  if (derived.state === "not-asked") return whyNotAsked;
  const { freshness, changedAt, notes } = derived;
  if (freshness === "changed-since" && changedAt) return `since ${timeOfDay({ at: changedAt, timeZone })}`;
  if (freshness === "lapsed") return "too long ago";
  if (notes.includes("patient-effort")) return "repeat relaxed";
  return derived.lastValue === null ? needs : null;
}

/** What a result cell says about a derived value. */
export function resultWords(derived: Derived | undefined, told: Told): ResultWords {
  const blank = { number: null, unit: told.unit, was: null, lastOutsideAt: null };
  if (!derived) return { ...blank, state: "unmeasured", aside: told.needs };
  const unit = derived.unit === "mL" ? "mL" : told.unit;
  if (derived.value !== null) {
    const number = written(derived.value, derived, derived.unit === "mL" ? 0 : told.decimals);
    return { ...blank, number, unit, state: derived.state, aside: null };
  }
  const was = derived.lastValue === null ? null : written(derived.lastValue, derived, told.decimals);
  const stale = derived.lastState === "outside" && derived.freshness !== "missing" && derived.chartedAt !== null;
  return {
    ...blank,
    unit,
    was,
    state: derived.state ?? "unmeasured",
    aside: stale ? null : asideOf(derived, told),
    lastOutsideAt: stale && derived.chartedAt ? timeOfDay({ at: derived.chartedAt, timeZone: told.timeZone }) : null,
  };
}
