import { act, render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useQuery } from "@tanstack/react-query";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { SessionGuard } from "@/components/shell/session-guard";
import { SideSheet } from "@/components/ui/side-sheet";
import { request } from "@/lib/client/api";
import { QueryProvider } from "@/lib/client/query-provider";
import { meSchema, type Me } from "@/lib/contracts";

const now = () => new Date().toISOString();
const later = (minutes: number) => new Date(Date.now() + minutes * 60_000).toISOString();

const me = (userId = "1", endsInMinutes = 600): Me => ({
  user: { id: userId, name: "Ada Example", email: "ada@example.test" },
  administrator: false,
  session: { endsAt: later(endsInMinutes), lastActionAt: now() },
  units: [],
});

const problem = (kind: string, status: number, detail: string) => ({
  type: `/problems/${kind}`,
  title: "",
  status,
  detail,
  errors: [],
});

type Reply = () => Response;
let replies: Record<string, Reply>;
let sent: { path: string; body: string | undefined }[];

beforeEach(() => {
  sent = [];
  replies = {
    "/api/me": () => Response.json(me()),
    "/api/session/unlock": () => Response.json({ lastActionAt: now() }),
  };
  vi.stubGlobal("fetch", async (path: string, init?: { body?: string }) => {
    sent.push({ path, body: init?.body });
    const reply = replies[path];
    if (!reply) throw new TypeError(`no reply for ${path}`);
    return reply();
  });
});

function Page() {
  const query = useQuery({ queryKey: ["me"], queryFn: () => request({ path: "/api/me", answer: meSchema }) });
  return <input aria-label="Plateau" data-answered={query.isSuccess} />;
}

function show(children = <Page />) {
  return render(
    <QueryProvider>
      <SessionGuard me={me()}>{children}</SessionGuard>
    </QueryProvider>,
  );
}

/** What any request of the page meets once the session has idled or ended. */
async function lose(kind: "locked" | "not-signed-in"): Promise<void> {
  replies["/api/me"] = () => Response.json(problem(kind, 401, "Sign in."), { status: 401 });
  await act(() => request({ path: "/api/me", answer: meSchema }).catch(() => undefined));
}

describe("a page whose session locks", () => {
  it("is covered, and what was typed is there again after its own person's password", async () => {
    show();
    await userEvent.type(screen.getByLabelText("Plateau"), "27");
    await lose("locked");
    expect(screen.getByRole("heading", { name: "Locked", level: 1 })).toBeVisible();
    expect(screen.queryByRole("textbox", { name: "Plateau" })).toBeNull();
    expect(screen.getByLabelText("Password of Ada Example")).toHaveFocus();

    replies["/api/me"] = () => Response.json(me());
    await userEvent.type(screen.getByLabelText("Password of Ada Example"), "low-water{Enter}");
    await waitFor(() => expect(screen.queryByRole("heading", { name: "Locked", level: 1 })).toBeNull());
    expect(sent.find(({ path }) => path === "/api/session/unlock")?.body).toBe('{"password":"low-water"}');
    expect(screen.getByRole("textbox", { name: "Plateau" })).toHaveValue("27");
  });

  it("stays covered after a wrong password, saying so", async () => {
    show();
    await lose("locked");
    replies["/api/session/unlock"] = () =>
      Response.json(problem("validation-failed", 422, "That is not your password."), { status: 422 });
    await userEvent.type(screen.getByLabelText("Password of Ada Example"), "wrong{Enter}");
    expect(await screen.findByRole("alert")).toHaveTextContent("That is not your password.");
    expect(screen.getByRole("heading", { name: "Locked", level: 1 })).toBeVisible();
  });

  it("counts a wait down on the button", async () => {
    show();
    await lose("locked");
    replies["/api/session/unlock"] = () =>
      Response.json(problem("slow-down", 429, "Too many tries."), { status: 429, headers: { "Retry-After": "2" } });
    await userEvent.type(screen.getByLabelText("Password of Ada Example"), "wrong{Enter}");
    expect(await screen.findByRole("button", { name: "Wait 2 s" })).toBeDisabled();
    expect(await screen.findByRole("button", { name: "Wait 1 s" }, { timeout: 2000 })).toBeDisabled();
    expect(await screen.findByRole("button", { name: "Unlock" }, { timeout: 2000 })).toBeEnabled();
  });

  it("is not opened by Escape, and takes the focus from a sheet that was open", async () => {
    show(
      <SideSheet open onClose={() => undefined} title="Correct">
        <input aria-label="Reason" />
      </SideSheet>,
    );
    await userEvent.type(screen.getByLabelText("Reason"), "misread");
    await lose("locked");
    const password = screen.getByLabelText("Password of Ada Example");
    await waitFor(() => expect(password).toHaveFocus());
    await userEvent.keyboard("low{Escape}-water");
    expect(password).toHaveValue("low-water");
    expect(screen.queryByRole("textbox", { name: "Reason" })).toBeNull();
    expect(screen.getByDisplayValue("misread")).toBeInTheDocument();
  });
});

describe("a page whose session ended", () => {
  it("asks for sign-in on the page, typed work kept", async () => {
    show();
    await userEvent.type(screen.getByLabelText("Plateau"), "27");
    await lose("not-signed-in");
    const heading = { name: "Your session has ended" };
    expect(await screen.findByRole("heading", heading, { timeout: 10_000 })).toBeVisible();
    expect(screen.getByDisplayValue("27")).toBeInTheDocument();
  });
});

describe("the last quarter of an hour", () => {
  it("is announced, once it has begun", async () => {
    vi.useFakeTimers({ toFake: ["setInterval", "Date"], shouldAdvanceTime: true });
    render(
      <QueryProvider>
        <SessionGuard me={me("1", 12)}>
          <Page />
        </SessionGuard>
      </QueryProvider>,
    );
    expect(screen.queryByText(/This session ends/)).toBeNull();
    await act(() => vi.advanceTimersByTimeAsync(15_000));
    expect(screen.getByText("This session ends in 12 min.")).toBeVisible();
  });
});
