import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import type { ChartAnswer, SettingsBody } from "@/lib/contracts";
import { chartAnswer } from "./chart-answer";
import { chartedMoment } from "./charted-moment";
import { fileEntries, submissionOf } from "./file-entries";
import { judgeEntry } from "./judge-entry";
import { openEpisode } from "./open-episode";
import { readCase } from "./read-case";

/** A change of settings, complete where it carries a mode. */
export async function chartSettings(
  ctx: Ctx,
  granted: GrantedPatient<"settings:chart">,
  { clientKey: _key, chartedAt, basedOn, reason, ...settings }: SettingsBody,
): Promise<ChartAnswer> {
  const { intubatedAt } = await openEpisode(ctx, granted);
  const moment = chartedMoment(chartedAt, { now: ctx.now, intubatedAt });
  const patientCase = await readCase(ctx, granted, { at: ctx.now });
  const entry = { chartedAt: moment.chartedAt, settings, basedOn, reason };
  judgeEntry(patientCase, entry, { settings: "", mechanics: "" });
  await fileEntries(ctx, granted, "chart.settings", [{ kind: "settings", moment, body: { ...settings, reason } }]);
  return chartAnswer(ctx, granted, submissionOf(ctx));
}
