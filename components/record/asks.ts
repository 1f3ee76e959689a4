import { unitOf, wordsOf } from "@/lib/contracts";
import { isUnusual, type ChartedField, type NumericSettingField } from "@/lib/physiology";
import type { Ask, AskContext } from "./ask";
import { readingAsks } from "./ask-about-reading";
import { alwaysAsks } from "./ask-always";
import { draftedMechanics, draftedObservations } from "./drafted-measurements";
import { draftedSettings, shownMode } from "./drafted-settings";
import { filledMode, type Filled } from "./filled";
import { limitsFieldOf } from "./form-fields";
import type { RecordValues } from "./record-values";

/** Where a target covers the field, the target speaks and the ask range stays silent. */
function isCovered(field: ChartedField, { targets, pbwKg }: AskContext): boolean {
  switch (field) {
    case "tidalVolumeMl":
    case "exhaledTidalVolumeMl":
      return Boolean(targets.vtMl ?? (pbwKg === null ? null : targets.vtMlPerKg));
    case "pressureAbovePeepCmH2O":
      return Boolean(targets.drivingPressureCmH2O);
    case "plateauCmH2O":
      return Boolean(targets.plateauCmH2O);
    case "respiratoryRate":
      return Boolean(targets.respiratoryRate);
    case "spo2Percent":
      return Boolean(targets.spo2Percent);
    default:
      return false;
  }
}

const say = (field: ChartedField, value: number) => [value, unitOf(field)].join(" ").trim();

function unusualAsk(field: ChartedField, value: number): Ask {
  return {
    key: `${field}=${value}`,
    question: `${wordsOf(field)} ${say(field, value)} is unusual.`,
    yes: `Yes, ${say(field, value)}`,
  };
}

/** Values this entry newly charts, by the field whose limits hold. What a new mode only carries over is not asked again. */
function chartedNumbers(values: RecordValues, filled: Filled): [ChartedField, number][] {
  const mode = shownMode(values, filled);
  const settings = Object.entries(draftedSettings(values, filled)).filter(
    ([field]) => mode === filledMode(filled) || values.settings[field as NumericSettingField] !== undefined,
  );
  const all = [
    ...settings,
    ...Object.entries(draftedMechanics(values) ?? {}),
    ...Object.entries(draftedObservations(values) ?? {}),
  ];
  return all.flatMap(([field, value]) => (typeof value === "number" ? [[limitsFieldOf(field, mode), value]] : []));
}

/** Everything this entry asks about before it is saved, one question a value. */
export function asksOf(values: RecordValues, filled: Filled, context: AskContext): Ask[] {
  const always = alwaysAsks(values, filled, context);
  const asked = new Set(always.map(({ key }) => key));
  const unusual = chartedNumbers(values, filled)
    .filter(([field, value]) => isUnusual(field, value) && !isCovered(field, context))
    .map(([field, value]) => unusualAsk(field, value));
  return [...always, ...unusual.filter(({ key }) => !asked.has(key)), ...readingAsks(values, filled)];
}
