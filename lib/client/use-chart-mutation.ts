"use client";

import { useMutation, useQueryClient } from "@tanstack/react-query";
import { chartAnswerSchema, type ChartAnswer } from "@/lib/contracts";
import { request } from "./api";
import { canBeSentAgain, waitBeforeTry } from "./can-be-sent-again";
import { holdWorksheet } from "./use-worksheet";

/** A body with its key: sent again and again as it is, so that the same key never meets another body. */
export interface Keyed {
  clientKey: string;
}

/**
 * Sends something to be charted and keeps trying while no answer comes. The key and the body stay the same, so a try
 * that arrived unseen is not charted twice. What the server refuses is not sent again.
 */
export function useChartMutation<Sent extends { body: Keyed }>(pathOf: (sent: Sent) => string) {
  const client = useQueryClient();
  const mutation = useMutation<ChartAnswer, Error, Sent>({
    mutationFn: (sent) => request({ path: pathOf(sent), body: sent.body, answer: chartAnswerSchema }),
    // A browser's word on being offline is unreliable on a ward's Wi-Fi: keep trying, and count the tries truthfully.
    networkMode: "always",
    retry: (_failures, error) => canBeSentAgain(error),
    retryDelay: (failures) => waitBeforeTry(failures + 1),
    onSuccess: (answer) => holdWorksheet(client, answer.worksheet),
  });
  return { ...mutation, tryNumber: mutation.failureCount + 1 };
}
