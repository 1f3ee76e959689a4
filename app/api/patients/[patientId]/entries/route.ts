import { readEntries } from "@/lib/chart/read-entries";
import { entriesAnswerSchema, entriesQuerySchema, patientParamsSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const GET = route({
  access: "patients:read",
  params: patientParamsSchema,
  query: entriesQuerySchema,
  response: entriesAnswerSchema,
  run: (ctx, { granted, query }) => readEntries(ctx, granted, query),
});
