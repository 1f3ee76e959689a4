import type { OrderDeparture } from "@/lib/protocol/settings-leave-order";
import type { Ask, AskContext } from "./ask";
import { asksOf } from "./asks";
import { departuresOf, movesTowardOrder } from "./departures";
import { draftedMechanics, draftedObservations } from "./drafted-measurements";
import { draftedSettings, shownMode } from "./drafted-settings";
import type { Filled } from "./filled";
import type { RecordValues } from "./record-values";
import { missingSettings, refusalsOf, type Refusals } from "./refusals";

/** Sent in place of a person's own words where a setting moves toward the order. */
export const towardOrder = "Toward the order";

export interface Readiness {
  refusals: Refusals;
  /** Questions not answered yet. */
  asks: Ask[];
  departures: OrderDeparture[];
  /** What the entry will carry as its reason. */
  reason: string | null;
  /** The first thing that still stands in the way of saving, as a sentence; null when nothing does. */
  blocker: string | null;
}

interface Judged extends AskContext {
  tidalVolumeStepMl: number;
}

function holdBlocker(values: RecordValues): string | null {
  const mechanics = draftedMechanics(values);
  if (mechanics?.plateauCmH2O !== undefined && values.hold === null) return "Say how the hold was.";
  if (values.hold === "not-possible") return values.holdReason.trim() ? null : "Say why the hold was not possible.";
  const withoutReading = values.hold !== null && mechanics?.plateauCmH2O === undefined;
  return withoutReading && values.endInspiratoryFlowZero !== true ? "Enter the plateau that the hold showed." : null;
}

function nothingEntered(values: RecordValues, filled: Filled): boolean {
  const settings = Object.keys(draftedSettings(values, filled)).length;
  return settings === 0 && !draftedMechanics(values) && !draftedObservations(values);
}

function reasonOf(values: RecordValues, departs: boolean, toward: boolean): string | null {
  if (departs) return values.reason.trim() || null;
  return toward ? towardOrder : null;
}

/** Whether, and why not yet, the form may be saved. */
export function readinessOf(values: RecordValues, filled: Filled, judged: Judged): Readiness {
  const refusals = refusalsOf(values, filled);
  const departures = departuresOf(values, filled, judged);
  const reason = reasonOf(values, departures.length > 0, movesTowardOrder(values, filled, judged));
  const asks = asksOf(values, filled, judged).filter(({ key }) => !values.confirmed.includes(key));
  const blockers = [
    shownMode(values, filled) || !nothingEntered(values, filled) ? null : "Choose the mode first.",
    Object.values(refusals)[0] ?? null,
    missingSettings(values, filled)[0]?.sentence ?? null,
    holdBlocker(values),
    nothingEntered(values, filled) ? "Nothing has been changed or measured yet." : null,
    asks.length > 0 ? "Answer what is asked." : null,
    departures.length > 0 && !reason ? "Pick a reason." : null,
  ];
  return { refusals, asks, departures, reason, blocker: blockers.find((blocker) => blocker !== null) ?? null };
}
