import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import {
  AppError,
  settingsValuesSchema,
  type ChartAnswer,
  type SettingsCheckBody,
  type SettingsValues,
} from "@/lib/contracts";
import { chartAnswer } from "./chart-answer";
import { chartedMoment } from "./charted-moment";
import { compareBasedOn, missingBasedOn } from "./compare-based-on";
import { fileEntries, submissionOf } from "./file-entries";
import { refuseIssues } from "./judge-entry";
import { settingsValues } from "./newest-values";
import { openEpisode } from "./open-episode";
import { readCase } from "./read-case";

const isSetting = (name: string): name is keyof SettingsValues => name in settingsValuesSchema.shape;

/** 'Checked, unchanged': confirms every setting in force, and so says what each of them was. */
export async function chartSettingsCheck(
  ctx: Ctx,
  granted: GrantedPatient<"settings-checks:chart">,
  { chartedAt, basedOn }: SettingsCheckBody,
): Promise<ChartAnswer> {
  const { intubatedAt } = await openEpisode(ctx, granted);
  const moment = chartedMoment(chartedAt, { now: ctx.now, intubatedAt });
  const { facts } = await readCase(ctx, granted, { at: ctx.now });
  const inForce = settingsValues(facts, moment.chartedAt);
  if (!inForce)
    throw new AppError("validation-failed", "No settings are in force at that time: there is nothing to check.");
  refuseIssues(missingBasedOn(Object.keys(inForce), basedOn));
  // A setting that the form showed and that is gone was not checked either.
  const confirmed = [...new Set([...Object.keys(inForce), ...Object.keys(basedOn ?? {})])].filter(isSetting);
  compareBasedOn(confirmed, { basedOn, inForce });
  await fileEntries(ctx, granted, "chart.settings-check", [{ kind: "settings-checks", moment, body: {} }]);
  return chartAnswer(ctx, granted, submissionOf(ctx));
}
