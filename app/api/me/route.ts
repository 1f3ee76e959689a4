import { readMe } from "@/lib/access/read-me";
import { meSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

export const GET = route({
  access: "session:own",
  response: meSchema,
  run: (ctx) => readMe(ctx),
});
