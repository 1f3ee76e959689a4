import { readBeds } from "@/lib/chart/read-beds";
import { bedsAnswerSchema, unitParamsSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const GET = route({
  access: "beds:read",
  params: unitParamsSchema,
  response: bedsAnswerSchema,
  run: (ctx, { granted }) => readBeds(ctx, granted),
});
