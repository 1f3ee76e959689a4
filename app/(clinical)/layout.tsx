import type { ReactNode } from "react";
import { QueryProvider } from "@/lib/client/query-provider";

/** One store of answers for all clinical pages, so that going back to Beds shows them at once. */
export default function ClinicalLayout({ children }: { children: ReactNode }) {
  return <QueryProvider>{children}</QueryProvider>;
}
