import {
  AppError,
  chartedSettings,
  plateauOverSetPeepIssue,
  settingsIssues,
  totalPeepIssue,
  type BasedOn,
  type Issue,
  type MechanicsValues,
  type SettingsValues,
} from "@/lib/contracts";
import { fieldsOfMode, type VentilationMode } from "@/lib/physiology";
import { pbwOf, policyOf, settingsLeaveOrder, type JudgedSettings } from "@/lib/protocol";
import { compareBasedOn, missingBasedOn, touchedFields, type SettingsInForce } from "./compare-based-on";
import { settingsValues } from "./newest-values";
import type { Case } from "./read-case";

/** What of an entry is judged against what was in force when it was true. */
export interface EntryToJudge {
  chartedAt: Date;
  settings?: SettingsValues | undefined;
  mechanics?: MechanicsValues | undefined;
  reason?: string | undefined;
  basedOn: BasedOn;
}

/** Where the form's fields stand in the body: a bedside entry keeps each kind under its own name. */
export interface FieldPaths {
  settings: string;
  mechanics: string;
}

const prefixed = (prefix: string, issues: readonly Issue[]): Issue[] =>
  issues.map(({ path, message }) => ({ path: prefix && path ? `${prefix}.${path}` : prefix || path, message }));

/** Settings in force after an entry: one that carries a mode begins anew, fields its mode does not use count for nothing. */
export function settingsAfter(inForce: SettingsInForce, settings: SettingsValues = {}): JudgedSettings {
  const before = Object.fromEntries(Object.entries(inForce).map(([field, { value }]) => [field, value]));
  return settings.mode ? settings : ({ ...before, ...settings } as JudgedSettings);
}

/** What the mode says to these settings: the entry's own mode, else the one in force. */
export function modeIssues(settings: SettingsValues, inForce: SettingsInForce): Issue[] {
  if (chartedSettings(settings).length === 0) return [{ path: "", message: "Enter at least one setting." }];
  const mode = (settings.mode ?? inForce.mode?.value) as VentilationMode | undefined;
  if (!mode) return [{ path: "mode", message: "No settings are in force at that time: choose the mode." }];
  return settingsIssues(settings, mode, settings.mode !== undefined);
}

/** What the set PEEP says to a reading. */
export function pressureIssues(mechanics: MechanicsValues, { mode, peepCmH2O }: JudgedSettings): Issue[] {
  const setPeep = mode && fieldsOfMode(mode).has("peepCmH2O") ? (peepCmH2O ?? null) : null;
  const found = [totalPeepIssue(mechanics.totalPeepCmH2O, setPeep), plateauOverSetPeepIssue(mechanics, setPeep)];
  return found.filter((issue) => issue !== null);
}

function reasonIssues({ at, unit, targets, facts }: Case, inForce: SettingsInForce, entry: EntryToJudge): Issue[] {
  if (entry.reason || !entry.settings) return [];
  const left = settingsLeaveOrder({
    targets,
    pbwKg: pbwOf(facts, at).pbwKg,
    before: settingsAfter(inForce),
    after: settingsAfter(inForce, entry.settings),
    tidalVolumeStepMl: policyOf(unit).steps.tidalVolumeMl,
  });
  if (left.length === 0) return [];
  const source = targets.origin === "order" ? "the order" : "the unit's default";
  return [{ path: "reason", message: `This takes volume or pressure out of ${source}, or further out: say why.` }];
}

export function refuseIssues(errors: Issue[]): void {
  if (errors.length > 0) throw new AppError("validation-failed", "Some values cannot be accepted.", { errors });
}

/** Refuses, all at once, what cannot be charted at that time; then what was charted meanwhile. */
export function judgeEntry(patientCase: Case, entry: EntryToJudge, paths: FieldPaths): void {
  const { settings, mechanics, basedOn } = entry;
  const inForce: SettingsInForce = settingsValues(patientCase.facts, entry.chartedAt) ?? {};
  const touched = touchedFields(settings, mechanics !== undefined);
  refuseIssues([
    ...(settings ? prefixed(paths.settings, modeIssues(settings, inForce)) : []),
    ...(mechanics ? prefixed(paths.mechanics, pressureIssues(mechanics, settingsAfter(inForce, settings))) : []),
    ...missingBasedOn(touched, basedOn),
    ...reasonIssues(patientCase, inForce, entry),
  ]);
  compareBasedOn(touched, { basedOn, inForce, yours: settings });
}
