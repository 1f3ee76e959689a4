import type { z } from "zod";
import { respond } from "./respond";

interface PublicSpec<Response extends z.ZodType> {
  /** Why nobody is asked who they are. */
  publicBecause: string;
  response: Response;
  run: () => Promise<z.input<Response>>;
}

/** A handler that answers anyone. Everything else goes through `route`, which asks for a session and a right. */
export function publicRoute<Response extends z.ZodType>(spec: PublicSpec<Response>) {
  return (request: Request) =>
    respond(request, async () => ({ status: 200, body: spec.response.parse(await spec.run()) }));
}
