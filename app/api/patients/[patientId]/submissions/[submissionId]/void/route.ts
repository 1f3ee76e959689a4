import { chartAnswer } from "@/lib/chart/chart-answer";
import { refuseVoid, voidSubmission } from "@/lib/chart/void-submission";
import { chartAnswerSchema, submissionParamsSchema, submissionVoidBodySchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const POST = route({
  access: "entries:correct",
  params: submissionParamsSchema,
  body: submissionVoidBodySchema,
  status: 201,
  response: chartAnswerSchema,
  guard: (ctx, { granted, params }) => refuseVoid(ctx, granted, params.submissionId),
  run: (ctx, { granted, params, body }) => voidSubmission(ctx, granted, { ...body, submissionId: params.submissionId }),
  repeat: (ctx, { granted, submissionId }) => chartAnswer(ctx, granted, submissionId),
});
