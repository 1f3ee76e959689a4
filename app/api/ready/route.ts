import { readySchema } from "@/lib/contracts";
import { assertReady } from "@/lib/http/assert-ready";
import { publicRoute } from "@/lib/http/public-route";

export const GET = publicRoute({
  publicBecause: "a balancer asks whether to send people here, and learns nothing else",
  response: readySchema,
  run: async () => {
    await assertReady();
    return { status: "ready" as const };
  },
});
