import { render } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { AppRouterContext } from "next/dist/shared/lib/app-router-context.shared-runtime";
import { vi } from "vitest";
import { RecordScreen } from "@/components/record/record-screen";
import { QueryProvider } from "@/lib/client/query-provider";
import type { Worksheet } from "@/lib/contracts";
import { buildWorksheet } from "./build-worksheet";

interface Rendered {
  worksheet?: Worksheet;
  personId?: string;
  focus?: string | null;
}

/** The whole record screen, as its page renders it. */
export function renderRecord({ worksheet = buildWorksheet(), personId = "2", focus = null }: Rendered = {}) {
  const user = userEvent.setup();
  const router = {
    push: vi.fn(),
    replace: vi.fn(),
    refresh: vi.fn(),
    back: vi.fn(),
    forward: vi.fn(),
    prefetch: vi.fn(),
    bfcacheId: "",
    experimental_gesturePush: vi.fn(),
  };
  const screen = render(
    <AppRouterContext.Provider value={router}>
      <QueryProvider>
        <RecordScreen initial={worksheet} person={{ id: personId, name: "Mara Okafor" }} focus={focus} />
      </QueryProvider>
    </AppRouterContext.Provider>,
  );
  return { user, router, ...screen };
}
