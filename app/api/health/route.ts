import { healthSchema } from "@/lib/contracts";
import { publicRoute } from "@/lib/http/public-route";

export const GET = publicRoute({
  publicBecause: "a balancer asks whether the process answers, and learns nothing else",
  response: healthSchema,
  run: async () => ({ status: "ok" as const }),
});
