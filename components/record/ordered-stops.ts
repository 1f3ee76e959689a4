import type { Worksheet } from "@/lib/contracts";
import type { NumericSettingField } from "@/lib/physiology";
import { shownNumber } from "./drafted-settings";
import type { Filled } from "./filled";
import type { RecordValues } from "./record-values";

const bounds = (range: { min?: number | undefined; max?: number | undefined } | null, times = 1): number[] =>
  [range?.min, range?.max].filter((bound) => bound !== undefined).map((bound) => bound * times);

/** Where holding a stepper stops: the ordered limits, in the field's own unit. */
export function orderedStops(
  field: NumericSettingField,
  { targets, pbwKg }: Worksheet,
  values: RecordValues,
  filled: Filled,
): number[] {
  const peep = shownNumber(values, filled, "peepCmH2O") ?? 0;
  const plateau = targets.plateauCmH2O?.max;
  switch (field) {
    case "tidalVolumeMl":
      if (targets.vtMl) return bounds(targets.vtMl);
      return pbwKg === null ? [] : bounds(targets.vtMlPerKg, pbwKg);
    case "respiratoryRate":
      return bounds(targets.respiratoryRate);
    case "pressureAbovePeepCmH2O":
      return [...bounds(targets.drivingPressureCmH2O), ...(plateau === undefined ? [] : [plateau - peep])];
    case "pHighCmH2O":
      return plateau === undefined ? [] : [plateau];
    default:
      return [];
  }
}
