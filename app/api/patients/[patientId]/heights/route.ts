import { chartAnswer } from "@/lib/chart/chart-answer";
import { recordHeight } from "@/lib/chart/record-height";
import { chartAnswerSchema, heightBodySchema, patientParamsSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const POST = route({
  access: "heights:chart",
  params: patientParamsSchema,
  body: heightBodySchema,
  status: 201,
  response: chartAnswerSchema,
  run: (ctx, { granted, body }) => recordHeight(ctx, granted, body),
  repeat: (ctx, { granted, submissionId }) => chartAnswer(ctx, granted, submissionId),
});
