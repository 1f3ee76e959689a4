import { trackDomains, type TrackMetric } from "@/components/figures/track-domain";
import type { Derived, Value, Worksheet } from "@/lib/contracts";
import type { FreshnessProps } from "@/components/figures/freshness";
import { clockTime, displayNumber } from "@/lib/format";
import { freshnessOf, lastOutsideTime, type Reading } from "./freshness-of";
import { whyUnmeasured } from "./note-words";
import type { MeasuredRow } from "./rows";

/** A measured cell: its number while that may be read as true, and how fresh it is. */
export interface Measured {
  label: string;
  text: string | null;
  freshness: FreshnessProps;
  /** The last value, where nothing stands now: 'was 26 at 22:15'. */
  was: string | null;
  everCharted: boolean;
  lastOutsideAt: string | null;
  notAsked: boolean;
  /** Why a fresh reading gives no number. */
  note: string | null;
  judged: (Pick<Derived, "value" | "lastValue" | "state" | "lastState" | "limit"> & { metric: TrackMetric }) | null;
}

const holdLabels: Record<string, string> = {
  relaxed: "Plateau, hold relaxed",
  effort: "Plateau, effort seen",
  unsure: "Plateau, hold not sure",
  "not-possible": "Plateau, not possible",
};

export function measuredOf(sheet: Worksheet, row: MeasuredRow, now: number): Measured {
  const { timeZone } = sheet.unit;
  const charted = chartedOf(sheet, row);
  const derived = row.derived ? sheet.derived[row.derived] : undefined;
  const reading = derived ?? sheet.measured[row.field] ?? unhurried(charted);
  const stands = derived ? derived.value !== null : isFresh(reading);
  const last = derived ? derived.lastValue : numberOf(charted);
  const value = derived ? derived.value : stands ? last : null;
  const limits = [derived?.limit?.min, derived?.limit?.max].filter((limit) => limit !== undefined);
  const write = (number: number) =>
    displayNumber({ value: number, decimals: decimalsOf(number, row.decimals), limit: limits });
  const at = derived?.chartedAt ?? charted?.chartedAt ?? null;
  const lastAt = at === null ? null : clockTime({ at, now, timeZone });
  return {
    label: row.field === "plateauCmH2O" ? (holdLabels[String(sheet.mechanics?.hold?.value)] ?? row.label) : row.label,
    text: value === null ? null : write(value),
    freshness: freshnessOf(reading, { now, timeZone }),
    was: value === null && last !== null && lastAt !== null ? `was ${write(last)} at ${lastAt}` : null,
    everCharted: charted !== undefined || last !== null,
    lastOutsideAt: (derived && lastOutsideTime(derived, { now, timeZone })) ?? null,
    notAsked: derived?.state === "not-asked",
    note: derived && derived.value === null && isFresh(derived) ? whyUnmeasured(derived.notes) : null,
    judged:
      derived && row.derived && row.derived in trackDomains ? { ...derived, metric: row.derived as TrackMetric } : null,
  };
}

const isFresh = ({ freshness }: Reading) => freshness === "current" || freshness === "due";

/** A reading that no change expires and no interval asks for: true as of its time. */
function unhurried(charted: Value | undefined): Reading {
  const at = charted?.chartedAt ?? null;
  return { freshness: charted ? "current" : "missing", changedAt: null, changedBy: null, dueAt: null, chartedAt: at };
}

function chartedOf(sheet: Worksheet, row: MeasuredRow): Value | undefined {
  if (row.source !== "bloodGas") return sheet[row.source]?.[row.field];
  const gas = sheet.bloodGas;
  const value = gas?.[row.field as "ph"];
  return gas && typeof value === "number" ? { ...gas, value } : undefined;
}

const numberOf = (charted: Value | undefined): number | null =>
  typeof charted?.value === "number" ? charted.value : null;

/** A reading keeps the decimals it was charted with: 27.5 is not shown as 28. */
const decimalsOf = (value: number, atLeast: number) =>
  Math.max(atLeast, Math.min(2, String(value).split(".")[1]?.length ?? 0));
