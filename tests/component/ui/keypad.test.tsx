import { Keypad, type KeypadProps } from "@/components/ui/keypad";
import { MeasuredField } from "@/components/ui/measured-field";
import { fireEvent, render, screen } from "@testing-library/react";
import { useState } from "react";
import { describe, expect, it, vi } from "vitest";

const holds = [
  { value: "relaxed", words: "relaxed" },
  { value: "effort", words: "effort seen" },
  { value: "unsure", words: "not sure" },
  { value: "not-possible", words: "not possible", apart: true },
];

function Typed(props: Partial<KeypadProps>) {
  const [text, setText] = useState("");
  return (
    <>
      <output>{text}</output>
      <Keypad label="Plateau" text={text} onChange={setText} onClose={() => undefined} {...props} />
    </>
  );
}

const press = (name: string) => fireEvent.click(screen.getByRole("button", { name }));
const typed = () => screen.getByRole("status").textContent;

describe("the keypad", () => {
  it("types digits, one point, and takes the last back", () => {
    render(<Typed />);
    for (const key of ["2", "7", "Point", "Point", "5"]) press(key);
    expect(typed()).toBe("27.5");
    press("Delete the last digit");
    expect(typed()).toBe("27.");
  });

  it("takes no more than the field holds", () => {
    render(<Typed most={3} />);
    for (const key of ["1", "2", "3", "4"]) press(key);
    expect(typed()).toBe("123");
  });

  it("a real keyboard types too, a comma as a point", () => {
    render(<Typed />);
    for (const key of ["2", "6", ",", "5", "Backspace"]) fireEvent.keyDown(document.body, { key });
    expect(typed()).toBe("26.");
  });

  it("leaves a field of its own, and shortcuts, to themselves", () => {
    render(
      <>
        <input aria-label="Search" />
        <Typed />
      </>,
    );
    fireEvent.keyDown(screen.getByRole("textbox", { name: "Search" }), { key: "4" });
    fireEvent.keyDown(document.body, { key: "4", ctrlKey: true });
    expect(typed()).toBe("");
  });

  it("has no OK key; Escape closes it", () => {
    const close = vi.fn();
    render(<Typed onClose={close} />);
    expect(screen.queryByRole("button", { name: /ok|enter|done/i })).toBeNull();
    fireEvent.keyDown(document.body, { key: "Escape" });
    expect(close).toHaveBeenCalledOnce();
  });

  it("offers the words of a hold beside the digits, none chosen beforehand", () => {
    const choose = vi.fn();
    render(<Typed choices={holds} onChoose={choose} />);
    const words = holds.map((hold) => screen.getByRole("button", { name: hold.words }));
    expect(words.every((button) => !button.hasAttribute("aria-pressed"))).toBe(true);
    press("effort seen");
    expect(choose).toHaveBeenCalledWith("effort");
  });

  it("leaves the fourth column empty for other fields", () => {
    render(<Typed />);
    expect(screen.getAllByRole("button")).toHaveLength(12);
  });
});

describe("the field of a measured number", () => {
  const word = { text: "hold?", chosen: false, onOpen: () => undefined };

  it("keeps the system's keyboard closed and opens ours", () => {
    const open = vi.fn();
    render(<MeasuredField label="Plateau" text="" onChange={() => undefined} onOpen={open} word={word} />);
    const field = screen.getByRole("textbox", { name: "Plateau" });
    expect(field).toHaveAttribute("inputmode", "none");
    fireEvent.focus(field);
    expect(open).toHaveBeenCalled();
  });

  it("says that the hold is not said yet, then how it was", () => {
    const shared = { label: "Plateau", text: "27", onChange: () => undefined, onOpen: () => undefined };
    const { rerender } = render(<MeasuredField {...shared} word={word} />);
    expect(screen.getByRole("button", { name: "Plateau, how the hold was: not said" })).toHaveTextContent("hold?");
    rerender(<MeasuredField {...shared} word={{ ...word, text: "relaxed", chosen: true }} />);
    expect(screen.getByRole("button", { name: "Plateau, how the hold was: relaxed" })).toBeVisible();
  });

  it("reads a decimal comma as a point and ties its refusal to the field", () => {
    const change = vi.fn();
    render(
      <MeasuredField
        label="Peak"
        text=""
        onChange={change}
        onOpen={() => undefined}
        error="Peak 7 is below plateau."
      />,
    );
    const field = screen.getByRole("textbox", { name: "Peak" });
    expect(field).toHaveAccessibleDescription("Peak 7 is below plateau.");
    expect(field).toBeInvalid();
    fireEvent.change(field, { target: { value: "26,5" } });
    expect(change).toHaveBeenCalledWith("26.5");
  });
});
