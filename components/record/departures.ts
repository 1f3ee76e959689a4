import { settingsLeaveOrder, type JudgedSettings, type OrderDeparture } from "@/lib/protocol/settings-leave-order";
import type { Targets } from "@/lib/protocol/targets";
import { shownMode, shownNumber } from "./drafted-settings";
import { filledMode, filledNumber, type Filled } from "./filled";
import type { RecordValues } from "./record-values";

interface OrderContext {
  targets: Targets;
  pbwKg: number | null;
  tidalVolumeStepMl: number;
}

const judgedFields = ["tidalVolumeMl", "pressureAbovePeepCmH2O", "peepCmH2O"] as const;

function settingsBefore(filled: Filled): JudgedSettings | null {
  const mode = filledMode(filled);
  if (!mode) return null;
  return { mode, ...Object.fromEntries(judgedFields.map((field) => [field, filledNumber(filled, field)])) };
}

function settingsAfter(values: RecordValues, filled: Filled): JudgedSettings {
  const mode = shownMode(values, filled);
  return { mode, ...Object.fromEntries(judgedFields.map((field) => [field, shownNumber(values, filled, field)])) };
}

/** Settings that this entry takes out of the order, or further out: for these a reason is asked. */
export function departuresOf(values: RecordValues, filled: Filled, order: OrderContext): OrderDeparture[] {
  return settingsLeaveOrder({
    ...order,
    before: settingsBefore(filled),
    after: settingsAfter(values, filled),
  });
}

/** Whether the entry moves a setting that was outside toward the order: the way back would have left it. */
export function movesTowardOrder(values: RecordValues, filled: Filled, order: OrderContext): boolean {
  const before = settingsBefore(filled);
  if (!before) return false;
  return settingsLeaveOrder({ ...order, before: settingsAfter(values, filled), after: before }).length > 0;
}
