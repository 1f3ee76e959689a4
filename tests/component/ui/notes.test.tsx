import { AnnouncerProvider, useAnnounce } from "@/components/ui/announcer";
import { Banner } from "@/components/ui/banner";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { ErrorNote } from "@/components/ui/error-note";
import { Question } from "@/components/ui/question";
import { SideSheet } from "@/components/ui/side-sheet";
import { Skeleton } from "@/components/ui/skeleton";
import { TextField } from "@/components/ui/text-field";
import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";

describe("controls", () => {
  it("a button is no submit unless it says so", () => {
    render(<Button>Not now</Button>);
    expect(screen.getByRole("button", { name: "Not now" })).toHaveAttribute("type", "button");
  });

  it("a button that is not ready is dashed, and can still be pressed to hear why", async () => {
    const press = vi.fn();
    render(
      <Button look="dashed" onClick={press}>
        Save
      </Button>,
    );
    const save = screen.getByRole("button", { name: "Save" });
    expect(save).toHaveClass("border-dashed");
    await userEvent.click(save);
    expect(press).toHaveBeenCalledOnce();
  });

  it("a field carries its label, hint and refusal", () => {
    render(<TextField label="E-mail" hint="of the hospital" error="This is no e-mail address." />);
    const field = screen.getByRole("textbox", { name: "E-mail" });
    expect(field).toHaveAccessibleDescription("This is no e-mail address. of the hospital");
    expect(field).toBeInvalid();
  });
});

describe("sheets and questions", () => {
  it("a sheet names itself and closes by its cross and by Escape", async () => {
    const close = vi.fn();
    render(
      <SideSheet open onClose={close} title="History of Plateau">
        <p>27 at 14:20</p>
      </SideSheet>,
    );
    expect(screen.getByRole("dialog", { name: "History of Plateau" })).toHaveTextContent("27 at 14:20");
    await userEvent.click(screen.getByRole("button", { name: "Close" }));
    await userEvent.keyboard("{Escape}");
    expect(close).toHaveBeenCalledTimes(2);
  });

  it("a closed sheet is not there", () => {
    render(
      <SideSheet open={false} onClose={() => undefined} title="History">
        <p>27</p>
      </SideSheet>,
    );
    expect(screen.queryByRole("dialog")).toBeNull();
  });

  it("a question holds its answers", async () => {
    const leave = vi.fn();
    render(
      <Question
        open
        title="Leave this form?"
        onClose={() => undefined}
        actions={<Button onClick={leave}>Leave</Button>}
      >
        What you typed is kept on this device.
      </Question>,
    );
    await userEvent.click(screen.getByRole("button", { name: "Leave" }));
    expect(leave).toHaveBeenCalledOnce();
  });
});

describe("notes", () => {
  it("a banner is read politely", () => {
    render(
      <Banner title="Kept on this device">
        <p>Sending, try 3. Keep this page open.</p>
      </Banner>,
    );
    expect(screen.getByRole("status")).toHaveTextContent("Kept on this deviceSending, try 3. Keep this page open.");
  });

  it("an error is read at once", () => {
    render(<ErrorNote>The password does not fit.</ErrorNote>);
    expect(screen.getByRole("alert")).toHaveTextContent("The password does not fit.");
  });

  it("an empty page says what would fill it", () => {
    render(<EmptyState title="No patient on a ventilator">Beds fill when somebody is admitted.</EmptyState>);
    expect(screen.getByRole("heading", { name: "No patient on a ventilator" })).toBeVisible();
  });

  it("a page on its way names itself and shows no number", () => {
    render(<Skeleton label="Loading beds" rows={3} />);
    expect(screen.getByRole("status", { name: "Loading beds" })).toHaveTextContent(/^$/);
  });

  it("the announcer says the same words again when they come again", async () => {
    function Saved() {
      const announce = useAnnounce();
      return <Button onClick={() => announce("Saved at 14:22")}>Save</Button>;
    }
    render(
      <AnnouncerProvider>
        <Saved />
      </AnnouncerProvider>,
    );
    await userEvent.click(screen.getByRole("button", { name: "Save" }));
    const first = screen.getByText("Saved at 14:22");
    await userEvent.click(screen.getByRole("button", { name: "Save" }));
    expect(screen.getByText("Saved at 14:22")).not.toBe(first);
  });
});
