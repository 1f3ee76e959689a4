import { chartAnswer } from "@/lib/chart/chart-answer";
import { chartObservations } from "@/lib/chart/chart-observations";
import { chartAnswerSchema, observationsBodySchema, patientParamsSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const POST = route({
  access: "observations:chart",
  params: patientParamsSchema,
  body: observationsBodySchema,
  status: 201,
  response: chartAnswerSchema,
  run: (ctx, { granted, body }) => chartObservations(ctx, granted, body),
  repeat: (ctx, { granted, submissionId }) => chartAnswer(ctx, granted, submissionId),
});
