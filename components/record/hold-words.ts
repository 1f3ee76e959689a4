import type { HoldQuality } from "@/lib/protocol/facts";

/** How a hold was, as people say it. */
export const holdWords: Record<HoldQuality, string> = {
  relaxed: "relaxed",
  effort: "effort seen",
  unsure: "not sure",
  "not-possible": "not possible",
};
