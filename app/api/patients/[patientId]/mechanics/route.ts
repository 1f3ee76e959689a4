import { chartAnswer } from "@/lib/chart/chart-answer";
import { chartMechanics } from "@/lib/chart/chart-mechanics";
import { chartAnswerSchema, mechanicsBodySchema, patientParamsSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const POST = route({
  access: "mechanics:chart",
  params: patientParamsSchema,
  body: mechanicsBodySchema,
  status: 201,
  response: chartAnswerSchema,
  run: (ctx, { granted, body }) => chartMechanics(ctx, granted, body),
  repeat: (ctx, { granted, submissionId }) => chartAnswer(ctx, granted, submissionId),
});
