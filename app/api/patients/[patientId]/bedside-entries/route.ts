import { chartAnswer } from "@/lib/chart/chart-answer";
import { chartBedsideEntry } from "@/lib/chart/chart-bedside-entry";
import { chartAnswerSchema, bedsideEntryBodySchema, patientParamsSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const POST = route({
  access: "bedside-entries:chart",
  params: patientParamsSchema,
  body: bedsideEntryBodySchema,
  status: 201,
  response: chartAnswerSchema,
  run: (ctx, { granted, body }) => chartBedsideEntry(ctx, granted, body),
  repeat: (ctx, { granted, submissionId }) => chartAnswer(ctx, granted, submissionId),
});
