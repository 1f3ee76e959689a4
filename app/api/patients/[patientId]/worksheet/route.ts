import { readWorksheet } from "@/lib/chart/read-worksheet";
import { patientParamsSchema, worksheetQuerySchema, worksheetSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

const moment = (instant: string | undefined) => (instant === undefined ? undefined : new Date(instant));

export const GET = route({
  access: "patients:read",
  params: patientParamsSchema,
  query: worksheetQuerySchema,
  response: worksheetSchema,
  run: (ctx, { granted, query: { at, knownAt, facts } }) =>
    readWorksheet(ctx, granted, { at: moment(at), knownAt: moment(knownAt), facts: facts === "1" }),
});
