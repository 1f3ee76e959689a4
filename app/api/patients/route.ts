import { admissionAnswer } from "@/lib/chart/admission-answer";
import { admitPatient } from "@/lib/chart/admit-patient";
import { admissionAnswerSchema, admissionBodySchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const POST = route({
  access: "patients:admit",
  body: admissionBodySchema,
  status: 201,
  response: admissionAnswerSchema,
  run: (ctx, { granted, body }) => admitPatient(ctx, granted, body),
  repeat: (ctx, { submissionId }) => admissionAnswer(ctx, submissionId),
});
