import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import type { ChartAnswer, MechanicsBody } from "@/lib/contracts";
import { chartAnswer } from "./chart-answer";
import { chartedMoment } from "./charted-moment";
import { fileEntries, submissionOf } from "./file-entries";
import { pressureIssues, refuseIssues, settingsAfter } from "./judge-entry";
import { settingsValues } from "./newest-values";
import { openEpisode } from "./open-episode";
import { readCase } from "./read-case";

/** What was measured, without a change of settings. */
export async function chartMechanics(
  ctx: Ctx,
  granted: GrantedPatient<"mechanics:chart">,
  { clientKey: _key, chartedAt, ...mechanics }: MechanicsBody,
): Promise<ChartAnswer> {
  const { intubatedAt } = await openEpisode(ctx, granted);
  const moment = chartedMoment(chartedAt, { now: ctx.now, intubatedAt });
  const { facts } = await readCase(ctx, granted, { at: ctx.now });
  const inForce = settingsValues(facts, moment.chartedAt) ?? {};
  refuseIssues(pressureIssues(mechanics, settingsAfter(inForce)));
  await fileEntries(ctx, granted, "chart.mechanics", [{ kind: "mechanics", moment, body: mechanics }]);
  return chartAnswer(ctx, granted, submissionOf(ctx));
}
