import { chartAnswer } from "@/lib/chart/chart-answer";
import { chartSettings } from "@/lib/chart/chart-settings";
import { chartAnswerSchema, settingsBodySchema, patientParamsSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const POST = route({
  access: "settings:chart",
  params: patientParamsSchema,
  body: settingsBodySchema,
  status: 201,
  response: chartAnswerSchema,
  run: (ctx, { granted, body }) => chartSettings(ctx, granted, body),
  repeat: (ctx, { granted, submissionId }) => chartAnswer(ctx, granted, submissionId),
});
