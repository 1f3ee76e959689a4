import type { BasedOn, BedsideEntryBody, SettingsCheckBody } from "@/lib/contracts";
import { draftedMechanics, draftedObservations } from "./drafted-measurements";
import { draftedSettings } from "./drafted-settings";
import type { Filled } from "./filled";
import type { RecordValues } from "./record-values";
import { fieldsOfMode } from "@/lib/physiology";
import { filledMode } from "./filled";

/** Measured pressures mean nothing without these, so an entry that measures says on which it measured. */
const underMechanics = [
  "tidalVolumeMl",
  "pressureAbovePeepCmH2O",
  "pressureSupportCmH2O",
  "peepCmH2O",
  "mode",
] as const;

function basedOnOf(fields: readonly string[], filled: Filled): BasedOn {
  const shown = Object.fromEntries(fields.map((field) => [field, filled.values[field] ?? null]));
  return Object.values(shown).some((value) => value !== null) ? shown : null;
}

/** What this form charts: differences and measurements only, or null where nothing was put in. */
export function bedsideEntry(
  values: RecordValues,
  filled: Filled,
  { clientKey, reason }: { clientKey: string; reason: string | null },
): BedsideEntryBody | null {
  const settings = draftedSettings(values, filled);
  const changed = Object.keys(settings);
  const mechanics = draftedMechanics(values);
  const observations = draftedObservations(values);
  if (changed.length === 0 && !mechanics && !observations) return null;
  return {
    chartedAt: filled.chartedAt,
    clientKey,
    basedOn: basedOnOf([...changed, ...(mechanics ? underMechanics : [])], filled),
    ...(changed.length > 0 && { settings }),
    ...(mechanics && { mechanics }),
    ...(observations && { observations }),
    ...(reason && { reason }),
  };
}

/** 'Checked, unchanged': confirms every setting the form shows, at its time. */
export function settingsCheck(filled: Filled, clientKey: string): SettingsCheckBody | null {
  const mode = filledMode(filled);
  if (!mode) return null;
  const confirmed = ["mode", ...fieldsOfMode(mode)];
  return { chartedAt: filled.chartedAt, clientKey, basedOn: basedOnOf(confirmed, filled) };
}
