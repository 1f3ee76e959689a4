import { beforeEach, vi } from "vitest";
import { AnnouncerProvider } from "@/components/ui/announcer";
import { WorksheetScreen } from "@/components/worksheet/worksheet-screen";
import type { Entry, Worksheet } from "@/lib/contracts";
import { observeServerTime } from "@/lib/client/server-clock";
import { QueryProvider } from "@/lib/client/query-provider";

/** The network's edge: answers the history, keeps what was sent, and notes what nobody expected. */
export const http = {
  entries: [] as Entry[],
  sent: [] as { path: string; body: unknown }[],
  /** What the server answers when the screen asks anew. */
  worksheet: null as Worksheet | null,
  answer: null as { status: number; body: unknown } | null,
  unanswered: [] as string[],
};

beforeEach(() => {
  Object.assign(http, { entries: [], sent: [], worksheet: null, answer: null, unanswered: [] });
  vi.stubGlobal("fetch", async (input: RequestInfo | URL, init?: RequestInit) => {
    const path = String(input);
    if (path.includes("/entries?") || path.endsWith("/entries"))
      return Response.json({ entries: http.entries, next: null });
    if (path.endsWith("/worksheet") && http.worksheet) return Response.json(http.worksheet);
    if (init?.method === "POST" && http.answer) {
      http.sent.push({ path, body: JSON.parse(String(init.body)) });
      return Response.json(http.answer.body, {
        status: http.answer.status,
        headers: { "Content-Type": http.answer.status >= 400 ? "application/problem+json" : "application/json" },
      });
    }
    http.unanswered.push(path);
    return Promise.reject(new TypeError("no such answer"));
  });
});

/** The screen as at the sheet's own moment: the server's clock is what it says. */
export function worksheetPage(sheet: Worksheet) {
  observeServerTime(sheet.at);
  http.worksheet = sheet;
  return (
    <QueryProvider>
      <AnnouncerProvider>
        <WorksheetScreen initial={sheet} />
      </AnnouncerProvider>
    </QueryProvider>
  );
}
