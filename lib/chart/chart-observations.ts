import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import type { ChartAnswer, ObservationsBody } from "@/lib/contracts";
import { chartAnswer } from "./chart-answer";
import { chartedMoment } from "./charted-moment";
import { fileEntries, submissionOf } from "./file-entries";
import { openEpisode } from "./open-episode";

/** SpO2 and what else the monitor shows. */
export async function chartObservations(
  ctx: Ctx,
  granted: GrantedPatient<"observations:chart">,
  { clientKey: _key, chartedAt, ...observations }: ObservationsBody,
): Promise<ChartAnswer> {
  const { intubatedAt } = await openEpisode(ctx, granted);
  const moment = chartedMoment(chartedAt, { now: ctx.now, intubatedAt });
  await fileEntries(ctx, granted, "chart.observations", [{ kind: "observations", moment, body: observations }]);
  return chartAnswer(ctx, granted, submissionOf(ctx));
}
