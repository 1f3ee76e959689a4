import { chartAnswer } from "@/lib/chart/chart-answer";
import { chartSettingsCheck } from "@/lib/chart/chart-settings-check";
import { chartAnswerSchema, settingsCheckBodySchema, patientParamsSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const POST = route({
  access: "settings-checks:chart",
  params: patientParamsSchema,
  body: settingsCheckBodySchema,
  status: 201,
  response: chartAnswerSchema,
  run: (ctx, { granted, body }) => chartSettingsCheck(ctx, granted, body),
  repeat: (ctx, { granted, submissionId }) => chartAnswer(ctx, granted, submissionId),
});
