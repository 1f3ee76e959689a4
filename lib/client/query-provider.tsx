"use client";

import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { useState, type ReactNode } from "react";
import { canBeSentAgain, waitBeforeTry } from "./can-be-sent-again";

/** One client a page: answers are held, refused requests are not repeated, lost ones are, three times. */
function makeQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        retry: (failures, error) => failures < 3 && canBeSentAgain(error),
        retryDelay: (failures) => waitBeforeTry(failures + 1),
        staleTime: 5_000,
      },
    },
  });
}

export function QueryProvider({ children }: { children: ReactNode }) {
  const [client] = useState(makeQueryClient);
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}
