"use client";

import { useQuery } from "@tanstack/react-query";
import { bedsAnswerSchema, type BedsAnswer } from "@/lib/contracts";
import { request } from "./api";
import { queryKeys } from "./query-keys";
import { observeServerTime } from "./server-clock";
import { pollEveryMs } from "./use-worksheet";

/** The unit's beds as rendered by the server, then kept fresh. */
export function useBeds({ unitId, initial }: { unitId: string; initial: BedsAnswer }) {
  return useQuery({
    queryKey: queryKeys.beds(unitId),
    queryFn: async ({ signal }) => {
      const beds = await request({ path: `/api/units/${unitId}/beds`, answer: bedsAnswerSchema, signal });
      observeServerTime(beds.at);
      return beds;
    },
    initialData: initial,
    initialDataUpdatedAt: Date.parse(initial.at),
    refetchInterval: pollEveryMs,
    refetchOnWindowFocus: "always",
  });
}
