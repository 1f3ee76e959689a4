import type { ReactNode } from "react";
import { SessionGuard } from "@/components/shell/session-guard";
import { readMe } from "@/lib/access/read-me";
import { QueryProvider } from "@/lib/client/query-provider";
import { pageRead } from "@/lib/http/page";

/** One store of answers for all clinical pages, so that going back to Beds shows them at once, behind one lock. */
export default async function ClinicalLayout({ children }: { children: ReactNode }) {
  const me = await pageRead({ access: "session:own", read: (ctx) => readMe(ctx) });
  return (
    <QueryProvider>
      <SessionGuard me={me}>{children}</SessionGuard>
    </QueryProvider>
  );
}
