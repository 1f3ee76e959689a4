import type { MechanicsValues, ObservationsValues } from "@/lib/contracts";
import type { ChartedField } from "@/lib/physiology";
import type { RecordValues } from "./record-values";
import { chartable } from "./typed-number";

function numbersOf(typed: Record<string, string>): Record<string, number> {
  const numbers = Object.entries(typed).map(([field, text]) => [field, chartable(field as ChartedField, text)]);
  return Object.fromEntries(numbers.filter(([, value]) => value !== null)) as Record<string, number>;
}

/** The measurements this entry charts, or null: none. A hold word stands only beside a plateau or a hold's outcome. */
export function draftedMechanics(values: RecordValues): MechanicsValues | null {
  const drafted: MechanicsValues = {
    ...numbersOf(values.mechanics),
    ...(values.hold && { hold: values.hold }),
    ...(values.hold === "not-possible" && values.holdReason.trim() && { holdReason: values.holdReason.trim() }),
    ...(values.endInspiratoryFlowZero !== null && { endInspiratoryFlowZero: values.endInspiratoryFlowZero }),
    ...(values.breathStacking !== null && { breathStacking: values.breathStacking }),
  };
  return Object.keys(drafted).length > 0 ? drafted : null;
}

export function draftedObservations(values: RecordValues): ObservationsValues | null {
  const drafted: ObservationsValues = numbersOf(values.observations);
  return Object.keys(drafted).length > 0 ? drafted : null;
}
