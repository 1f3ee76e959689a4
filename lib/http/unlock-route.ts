import { addressOf } from "@/lib/access/address";
import { signedIn } from "@/lib/access/session";
import { unlock } from "@/lib/access/unlock";
import { AppError, sessionAnswerSchema, unlockBodySchema } from "@/lib/contracts";
import { checked } from "./checked";
import { readJson, refuseOtherMedia } from "./json-body";
import { respond, type Answer } from "./respond";
import { refuseForeignOrigin } from "./same-origin";

async function handle(request: Request): Promise<Answer> {
  refuseForeignOrigin(request);
  refuseOtherMedia(request);
  const now = new Date();
  const found = await signedIn(request.headers.get("cookie"), now);
  if (!found) throw new AppError("not-signed-in", "This session has ended. Sign in to go on.");
  const { password } = checked(unlockBodySchema, await readJson(request));
  await unlock(found, { password, address: addressOf(request.headers.get("x-forwarded-for")), now });
  return { status: 200, body: sessionAnswerSchema.parse({ lastActionAt: now.toISOString() }) };
}

/**
 * The one call that a locked session may make. Not a `route`: a failure must be counted although it is refused, so no
 * transaction stands around it.
 */
export function unlockRoute() {
  return (request: Request) => respond(request, () => handle(request));
}
