import { displayNumber, timeOfDay } from "@/lib/format";
import { stateWord } from "@/components/figures/state-word";
import { holdWords } from "./hold-words";
import type { Pending } from "./pending-facts";
import type { RecordState } from "./use-record";

export interface SentWords {
  title: string;
  sentence: string;
  /** A hold is what comes next. */
  wantsHold: boolean;
}

const asked: readonly unknown[] = ["not-asked", null];

/** The hold that is due next, and why, in words. */
export function sentWords({ live, worksheet, now }: RecordState, pending: Pending): SentWords {
  const { timeZone } = worksheet.unit;
  const time = (at: string) => timeOfDay({ at, timeZone });
  const hold = live.evaluation.due.find(({ what }) => what === "hold");
  const plateau = live.evaluation.derived.plateauCmH2O;
  const expired = plateau.value === null && !asked.includes(plateau.state);
  const overdue = hold ? Date.parse(hold.dueAt) <= now : false;
  const title = hold
    ? overdue
      ? `Hold due since ${time(hold.dueAt)}`
      : `${expired ? "Hold" : "Next hold"} due ${time(hold.dueAt)}`
    : "No hold is due";
  return { title, sentence: sentenceOf(live, pending, time), wantsHold: expired && worksheet.can.mechanics };
}

function sentenceOf(live: RecordState["live"], pending: Pending, time: (at: string) => string): string {
  const { plateauCmH2O: plateau, drivingPressureCmH2O: driving } = live.evaluation.derived;
  if (plateau.freshness === "changed-since" && plateau.changedAt) {
    return `Plateau, driving pressure and compliance are not measured since the change at ${time(plateau.changedAt)}.`;
  }
  if (plateau.freshness === "missing" && plateau.state !== "not-asked") return "No plateau has been measured yet.";
  const mechanics = pending.entry.route === "bedside-entries" ? pending.entry.body.mechanics : undefined;
  const heldNow = mechanics?.hold
    ? `The hold at ${time(pending.filled.chartedAt)} was ${holdWords[mechanics.hold]}. `
    : "";
  return heldNow + drivingWords(driving);
}

function drivingWords({
  value,
  state,
  limit,
}: RecordState["live"]["evaluation"]["derived"]["drivingPressureCmH2O"]): string {
  if (value === null || state === null) return "";
  const max = limit?.max;
  if (max !== undefined && Math.abs(value - max) < 1e-6) {
    return `Driving pressure is exactly on the ${limit?.origin === "order" ? "ordered" : "default"} limit, ${displayNumber({ value: max, decimals: 0 })} cmH2O.`;
  }
  return `Driving pressure is ${stateWord(state)}.`;
}
