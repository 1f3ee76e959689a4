"use client";

import { queryOptions, useQuery, useQueryClient, type QueryClient } from "@tanstack/react-query";
import { worksheetSchema, type Worksheet } from "@/lib/contracts";
import { request } from "./api";
import { queryKeys } from "./query-keys";
import { observeServerTime } from "./server-clock";

/** Polling until the unit's stream of events exists. */
export const pollEveryMs = 30_000;

function worksheetOptions(patientId: string, withFacts: boolean) {
  const path = `/api/patients/${patientId}/worksheet${withFacts ? "?facts=1" : ""}`;
  return queryOptions({
    queryKey: withFacts ? queryKeys.worksheetWithFacts(patientId) : queryKeys.worksheet(patientId),
    queryFn: async ({ signal }) => {
      const worksheet = await request({ path, answer: worksheetSchema, signal });
      observeServerTime(worksheet.at);
      return worksheet;
    },
    refetchInterval: pollEveryMs,
    refetchOnWindowFocus: "always",
  });
}

interface WorksheetQuery {
  patientId: string;
  /** What the server rendered the page from. */
  initial: Worksheet;
  /** Asks for the facts too, for a result worked out here while a person types. */
  withFacts?: boolean;
}

/** The worksheet as rendered by the server, then kept fresh; polling rests while the page is hidden. */
export function useWorksheet({ patientId, initial, withFacts = false }: WorksheetQuery) {
  const query = useQuery({
    ...worksheetOptions(patientId, withFacts),
    initialData: initial,
    initialDataUpdatedAt: Date.parse(initial.at),
  });
  // An answer held from an earlier visit may be older than the page that was just rendered.
  const data = Date.parse(query.data.at) >= Date.parse(initial.at) ? query.data : initial;
  return { data, failureCount: query.failureCount };
}

/** A save's own answer is the newest truth of that patient: put it in place, and ask anew for the rest. */
export function holdWorksheet(client: QueryClient, worksheet: Worksheet): void {
  observeServerTime(worksheet.at);
  const { id } = worksheet.patient;
  client.setQueryData(queryKeys.worksheet(id), worksheet);
  // Not waited for: the save is done, whatever becomes of these.
  for (const queryKey of [
    queryKeys.worksheetWithFacts(id),
    queryKeys.allEntries(id),
    queryKeys.unit(worksheet.unit.id),
  ]) {
    void client.invalidateQueries({ queryKey });
  }
}

export function useRefetchWorksheet(patientId: string): () => Promise<void> {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: queryKeys.patient(patientId) });
}
