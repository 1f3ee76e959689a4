import { chartAnswer } from "@/lib/chart/chart-answer";
import { correctEntry, refuseCorrection } from "@/lib/chart/correct-entry";
import { chartAnswerSchema, correctionBodySchema, entryParamsSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const POST = route({
  access: "entries:correct",
  params: entryParamsSchema,
  body: correctionBodySchema,
  status: 201,
  response: chartAnswerSchema,
  guard: (ctx, { granted, params, json }) => refuseCorrection(ctx, granted, params.entryId, json),
  run: (ctx, { granted, params, body }) => correctEntry(ctx, granted, { ...body, entryId: params.entryId }),
  repeat: (ctx, { granted, submissionId }) => chartAnswer(ctx, granted, submissionId),
});
