import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import { AppError, heightMethods, type ChartAnswer, type HeightBody, type HeightMethod } from "@/lib/contracts";
import type { HeightFact } from "@/lib/protocol";
import { ageInYears } from "./age-in-years";
import { chartAnswer } from "./chart-answer";
import { bedsideDate, chartedMoment, type ChartedMoment } from "./charted-moment";
import { fileEntries, submissionOf } from "./file-entries";
import { openEpisode } from "./open-episode";
import { readCase } from "./read-case";
import { workedOutHeightCm, type MeasuredLength } from "./worked-out-height";

/** What is stored: the length that was measured and the height worked out from it at that age. */
export function heightDetail<Length extends MeasuredLength>(
  length: Length,
  { birthDate, moment, path }: { birthDate: string; moment: ChartedMoment; path?: string },
): Length & { heightCm: number } {
  const ageYears = ageInYears({ birthDate, onDate: bedsideDate(moment) });
  return { ...length, heightCm: workedOutHeightCm(length, ageYears, path) };
}

const rankOf = (method: HeightMethod) => heightMethods.indexOf(method);

function refuseLowerMethod(heights: readonly HeightFact[] = [], moment: ChartedMoment, height: HeightBody): void {
  const replaced = heights.filter(({ chartedAt }) => new Date(chartedAt) <= moment.chartedAt).at(-1);
  if (!replaced || height.reason || rankOf(height.method) <= rankOf(replaced.method)) return;
  const message = `This replaces a height got by a better method (${replaced.method}): say why.`;
  throw new AppError("validation-failed", message, { errors: [{ path: "reason", message }] });
}

/** A height with its method and the sex used for PBW; a lower method replaces a higher one only with a reason. */
export async function recordHeight(
  ctx: Ctx,
  granted: GrantedPatient<"heights:chart">,
  body: HeightBody,
): Promise<ChartAnswer> {
  const { intubatedAt } = await openEpisode(ctx, granted);
  const moment = chartedMoment(body.chartedAt, { now: ctx.now, intubatedAt });
  const { facts, episode } = await readCase(ctx, granted, { at: ctx.now });
  const detail = heightDetail(body, { birthDate: episode.birthDate, moment });
  refuseLowerMethod(facts.heights, moment, body);
  await fileEntries(ctx, granted, "chart.height", [{ kind: "heights", moment, body: detail }]);
  return chartAnswer(ctx, granted, submissionOf(ctx));
}
