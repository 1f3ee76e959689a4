import { AppFrame } from "@/components/shell/app-frame";
import { CautionLine } from "@/components/shell/caution-line";
import { DemoProvider } from "@/components/shell/demo-chip";
import { LockPanel } from "@/components/shell/lock-panel";
import { ErrorMessage, ForbiddenMessage, NotFoundMessage } from "@/components/shell/messages";
import { SignInPanel } from "@/components/shell/sign-in-panel";
import { ThemeSwitch } from "@/components/shell/theme-switch";
import { TopBar, type TopBarProps } from "@/components/shell/top-bar";
import { UnitClock } from "@/components/shell/unit-clock";
import { render, screen, within } from "@testing-library/react";
import { renderToString } from "react-dom/server";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";

const bar: TopBarProps = {
  here: "worksheet",
  worksheetHref: "/patients/7",
  unit: { name: "Harbour ICU", timeZone: "Europe/London", shift: "Day shift" },
  userName: "M. Okafor, RT",
  now: "2026-12-01T16:45:00Z",
};

const caution =
  "Supports, does not replace, judgement. Check ventilator and patient. Adults only. Not an alarm, not a certified device.";

describe("the top bar", () => {
  it("leads to what is built: Beds and the patient last seen", () => {
    render(<TopBar {...bar} />);
    const pages = within(screen.getByRole("navigation", { name: "Pages" }));
    expect(pages.getAllByRole("link").map((link) => [link.textContent, link.getAttribute("href")])).toEqual([
      ["Beds", "/beds"],
      ["Worksheet", "/patients/7"],
    ]);
    expect(pages.getByRole("link", { current: "page" })).toHaveTextContent("Worksheet");
  });

  it("Worksheet leads to Beds until a patient was seen", () => {
    render(<TopBar {...bar} here="beds" worksheetHref={null} />);
    expect(screen.getByRole("link", { name: "Worksheet" })).toHaveAttribute("href", "/beds");
  });

  it("an administrator has no links to patients", () => {
    render(<TopBar {...bar} here={null} clinical={false} />);
    expect(screen.queryByRole("link")).toBeNull();
  });

  it("says DEMO in the demo and nowhere else", () => {
    const { rerender } = render(<TopBar {...bar} />);
    expect(screen.queryByText("DEMO")).toBeNull();
    rerender(
      <DemoProvider value>
        <TopBar {...bar} />
      </DemoProvider>,
    );
    expect(screen.getByText("DEMO")).toBeVisible();
  });

  it("the way out is in the menu of the person", async () => {
    render(<TopBar {...bar} />);
    await userEvent.click(screen.getByRole("button", { name: /M\. Okafor, RT/ }));
    expect(screen.getByRole("menuitem", { name: "Sign out" })).toBeVisible();
  });

  it("the menu holds only menu items, links and theme for the phone among them", async () => {
    render(<TopBar {...bar} />);
    await userEvent.click(screen.getByRole("button", { name: /M\. Okafor, RT/ }));
    const menu = screen.getByRole("menu");
    expect(within(menu).queryByRole("button")).toBeNull();
    expect(within(menu).getByRole("menuitem", { name: "Beds" })).toHaveAttribute("href", "/beds");
  });
});

describe("the theme switch", () => {
  it("turns the page to night and back, and remembers it on this device", async () => {
    vi.stubGlobal("matchMedia", () => ({
      matches: false,
      addListener: () => undefined,
      removeListener: () => undefined,
    }));
    const switcher = (
      <AppFrame demo={false}>
        <ThemeSwitch />
      </AppFrame>
    );
    // As the server sends it: the theme's script runs before the page, never from the client.
    const container = document.body.appendChild(document.createElement("div"));
    container.innerHTML = renderToString(switcher);
    render(switcher, { container, hydrate: true });
    const page = document.documentElement;
    await userEvent.click(screen.getByRole("button"));
    expect(page).toHaveAttribute("data-theme", "night");
    expect(localStorage.getItem("theme")).toBe("night");
    await userEvent.click(screen.getByRole("button"));
    expect(page).toHaveAttribute("data-theme", "day");
  });
});

describe("the clock", () => {
  it("shows the unit's time, not the device's", () => {
    render(<UnitClock timeZone="America/Denver" now="2026-12-01T16:45:00Z" />);
    expect(screen.getByText("09:45")).toBeVisible();
    expect(screen.getByText("Tue 1 Dec")).toBeInTheDocument();
  });
});

describe("the caution", () => {
  it("stands on the page word for word", () => {
    render(<CautionLine />);
    expect(screen.getByText(caution)).toBeVisible();
    expect(screen.queryByText("Demo data, invented people")).toBeNull();
  });

  it("says in the demo that data and people are invented", () => {
    render(
      <DemoProvider value>
        <CautionLine />
      </DemoProvider>,
    );
    expect(screen.getByText("Demo data, invented people")).toBeInTheDocument();
  });
});

describe("sign-in", () => {
  const demo = { people: [{ role: "Nurse", email: "nurse@neaptide.test" }], password: "small-tides-2026" };

  it("one tap on a demo person fills the form", async () => {
    const signIn = vi.fn();
    render(<SignInPanel onSignIn={signIn} busy={false} demo={demo} />);
    await userEvent.click(screen.getByRole("button", { name: /Nurse/ }));
    expect(screen.getByText("filled in")).toBeVisible();
    await userEvent.click(screen.getByRole("button", { name: "Sign in" }));
    expect(signIn.mock.calls[0]?.[0]).toEqual({ email: "nurse@neaptide.test", password: "small-tides-2026" });
  });

  it("lists nobody outside the demo, and offers no password reset before there is one", () => {
    render(<SignInPanel onSignIn={() => undefined} busy={false} />);
    expect(screen.queryByText("Demo people")).toBeNull();
    expect(screen.queryByText(/forgot/i)).toBeNull();
  });

  it("says why it was refused, and waits while it asks", () => {
    render(<SignInPanel onSignIn={() => undefined} busy problem="E-mail or password does not fit." />);
    expect(screen.getByRole("alert")).toHaveTextContent("E-mail or password does not fit.");
    expect(screen.getByRole("button", { name: "Signing in" })).toBeDisabled();
  });
});

describe("the lock", () => {
  it("asks that person's password, or lets someone else in", async () => {
    const unlock = vi.fn();
    const someoneElse = vi.fn();
    render(<LockPanel name="M. Okafor, RT" onUnlock={unlock} onSomeoneElse={someoneElse} busy={false} />);
    await userEvent.type(screen.getByLabelText("Password of M. Okafor, RT"), "tide{Enter}");
    expect(unlock).toHaveBeenCalledWith("tide");
    await userEvent.click(screen.getByRole("button", { name: "Someone else" }));
    expect(someoneElse).toHaveBeenCalledOnce();
  });
});

describe("messages", () => {
  it.each([
    ["Not found", <NotFoundMessage key="n" />],
    ["Not for your role", <ForbiddenMessage key="f" />],
    ["This page failed", <ErrorMessage key="e" reference="r-7" onRetry={() => undefined} />],
  ])("%s: a heading, a way back and the caution", (title, page) => {
    render(page);
    expect(screen.getByRole("heading", { level: 1, name: title })).toBeVisible();
    expect(screen.getByRole("link", { name: "To the beds" })).toHaveAttribute("href", "/beds");
    expect(screen.getByText(caution)).toBeVisible();
  });

  it("a failed page can be tried again and names its reference", async () => {
    const retry = vi.fn();
    render(<ErrorMessage reference="r-7" onRetry={retry} />);
    expect(screen.getByText("Reference r-7")).toBeVisible();
    await userEvent.click(screen.getByRole("button", { name: "Try again" }));
    expect(retry).toHaveBeenCalledOnce();
  });
});
