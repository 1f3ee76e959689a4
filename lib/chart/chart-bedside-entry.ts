import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import type { BedsideEntryBody, ChartAnswer } from "@/lib/contracts";
import { chartAnswer } from "./chart-answer";
import { chartedMoment, type ChartedMoment } from "./charted-moment";
import { fileEntries, submissionOf, type NewEntry } from "./file-entries";
import { judgeEntry } from "./judge-entry";
import { openEpisode } from "./open-episode";
import { readCase } from "./read-case";

function entriesOf({ settings, mechanics, observations, reason }: BedsideEntryBody, moment: ChartedMoment): NewEntry[] {
  const entries: NewEntry[] = [];
  if (settings) entries.push({ kind: "settings", moment, body: { ...settings, reason } });
  if (mechanics) entries.push({ kind: "mechanics", moment, body: mechanics });
  if (observations) entries.push({ kind: "observations", moment, body: observations });
  return entries;
}

/** Settings and what was measured on them, in one submission: one entry a kind, all or none. */
export async function chartBedsideEntry(
  ctx: Ctx,
  granted: GrantedPatient<"bedside-entries:chart">,
  body: BedsideEntryBody,
): Promise<ChartAnswer> {
  const { intubatedAt } = await openEpisode(ctx, granted);
  const moment = chartedMoment(body.chartedAt, { now: ctx.now, intubatedAt });
  const patientCase = await readCase(ctx, granted, { at: ctx.now });
  judgeEntry(patientCase, { ...body, chartedAt: moment.chartedAt }, { settings: "settings", mechanics: "mechanics" });
  await fileEntries(ctx, granted, "chart.bedside-entry", entriesOf(body, moment));
  return chartAnswer(ctx, granted, submissionOf(ctx));
}
