import { Stepper, type StepperProps } from "@/components/ui/stepper";
import { act, fireEvent, render, screen } from "@testing-library/react";
import { useState } from "react";
import { beforeEach, describe, expect, it, vi } from "vitest";

const peep = { label: "PEEP", step: 1, min: 0, max: 50, limits: [] as readonly number[] };

let keypad: ReturnType<typeof vi.fn<StepperProps["onKeypad"]>>;

function Held({ start, ...props }: { start: number | null } & Partial<StepperProps>) {
  const [value, setValue] = useState(start);
  return (
    <Stepper
      {...peep}
      {...props}
      value={value}
      text={value === null ? "" : String(value)}
      spoken={`${value} cmH2O`}
      onChange={setValue}
      onKeypad={keypad}
    />
  );
}

const more = () => screen.getByRole("button", { name: /more$/ });
const less = () => screen.getByRole("button", { name: /less$/ });
const number = () => screen.getByRole("spinbutton");

function hold(button: HTMLElement, ms: number) {
  fireEvent.pointerDown(button);
  act(() => vi.advanceTimersByTime(0));
  for (let passed = 0; passed < ms; passed += 10) act(() => vi.advanceTimersByTime(10));
  fireEvent.pointerUp(button);
  fireEvent.click(button);
}

beforeEach(() => {
  keypad = vi.fn();
  vi.useFakeTimers();
});

describe("the stepper", () => {
  it("is a spin button with its value, range and words", () => {
    render(<Held start={10} />);
    expect(number()).toHaveAccessibleName("PEEP");
    expect(number()).toHaveAttribute("aria-valuenow", "10");
    expect(number()).toHaveAttribute("aria-valuetext", "10 cmH2O");
    expect(number()).toHaveAttribute("aria-valuemin", "0");
    expect(number()).toHaveAttribute("aria-valuemax", "50");
  });

  it("steps once a press", () => {
    render(<Held start={10} />);
    fireEvent.click(more());
    fireEvent.click(more());
    fireEvent.click(less());
    expect(number()).toHaveTextContent("11");
  });

  it("held, repeats until let go, and the release adds none", () => {
    render(<Held start={10} />);
    hold(more(), 450 + 4 * 110);
    const reached = Number(number().textContent);
    expect(reached).toBeGreaterThan(12);
    act(() => vi.advanceTimersByTime(2000));
    expect(number()).toHaveTextContent(String(reached));
  });

  it("held, stops on an ordered limit; the next press goes past it", () => {
    render(<Held start={10} limits={[14]} />);
    hold(more(), 5000);
    expect(number()).toHaveTextContent("14");
    fireEvent.pointerDown(more());
    fireEvent.pointerUp(more());
    fireEvent.click(more());
    expect(number()).toHaveTextContent("15");
  });

  it("held, stops short of a limit that lies between two steps", () => {
    render(<Held start={450} label="Tidal volume" step={10} min={20} max={2000} limits={[353, 493]} />);
    hold(more(), 5000);
    expect(number()).toHaveTextContent("490");
  });

  it("held downward, stops at the lower limit too", () => {
    render(<Held start={400} label="Tidal volume" step={10} min={20} max={2000} limits={[353, 493]} />);
    hold(less(), 5000);
    expect(number()).toHaveTextContent("360");
  });

  it("a finger that slides off changes nothing", () => {
    render(<Held start={10} />);
    fireEvent.pointerDown(more());
    fireEvent.pointerLeave(more());
    act(() => vi.advanceTimersByTime(2000));
    expect(number()).toHaveTextContent("10");
  });

  it("never leaves its range", () => {
    render(<Held start={50} />);
    fireEvent.click(more());
    expect(number()).toHaveTextContent("50");
  });

  it("FiO2 steps from 0.25 to 0.21 and back", () => {
    render(<Held start={0.25} label="FiO2" step={0.05} min={0.21} max={1} />);
    fireEvent.click(less());
    expect(number()).toHaveTextContent("0.21");
    fireEvent.click(more());
    expect(number()).toHaveTextContent("0.25");
  });

  it("arrow keys step", () => {
    render(<Held start={10} />);
    fireEvent.keyDown(number(), { key: "ArrowUp" });
    fireEvent.keyDown(number(), { key: "ArrowUp" });
    fireEvent.keyDown(number(), { key: "ArrowDown" });
    expect(number()).toHaveTextContent("11");
  });

  it("touching the number opens the keypad; a typed digit opens it with that digit", () => {
    render(<Held start={10} />);
    fireEvent.click(number());
    expect(keypad).toHaveBeenLastCalledWith();
    fireEvent.keyDown(number(), { key: "1" });
    expect(keypad).toHaveBeenLastCalledWith("1");
    fireEvent.keyDown(number(), { key: "Enter" });
    expect(keypad).toHaveBeenLastCalledWith();
  });

  it("without a value both buttons open the keypad", () => {
    render(<Held start={null} />);
    expect(number()).toHaveAttribute("aria-valuetext", "not charted");
    fireEvent.click(more());
    fireEvent.click(less());
    expect(keypad).toHaveBeenCalledTimes(2);
  });
});
