"use client";

import { useInfiniteQuery } from "@tanstack/react-query";
import { entriesAnswerSchema } from "@/lib/contracts";
import { request } from "./api";
import { queryKeys, type EntriesFilter } from "./query-keys";

function pathOf(patientId: string, filter: EntriesFilter, before: string | null): string {
  const query = new URLSearchParams();
  if (filter.kind) query.set("kind", filter.kind);
  if (filter.field) query.set("field", filter.field);
  if (before) query.set("before", before);
  const asked = query.toString();
  return `/api/patients/${patientId}/entries${asked ? `?${asked}` : ""}`;
}

/** What was charted, newest first, page by page; struck entries are in it. */
export function useEntries({ patientId, filter }: { patientId: string; filter: EntriesFilter }) {
  return useInfiniteQuery({
    queryKey: queryKeys.entries(patientId, filter),
    queryFn: ({ pageParam, signal }) =>
      request({ path: pathOf(patientId, filter, pageParam), answer: entriesAnswerSchema, signal }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
  });
}
