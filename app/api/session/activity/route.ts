import { activityBodySchema, sessionAnswerSchema } from "@/lib/contracts";
import { route } from "@/lib/http/route";

/** A key or a touch on the page: the call itself is the action that keeps the session from locking. */
export const POST = route({
  access: "session:own",
  body: activityBodySchema,
  response: sessionAnswerSchema,
  run: async ({ now }) => ({ lastActionAt: now.toISOString() }),
});
