"use client";

import { Quantity } from "@/components/figures/quantity";
import type { KeyboardEvent } from "react";
import { nextValue, passesLimit, type StepRange } from "./next-value";
import { useHoldToRepeat } from "./use-hold-to-repeat";

export interface StepperProps extends StepRange {
  /** The field's name, read aloud ('PEEP'). */
  label: string;
  /** How the value is spoken ('12 cmH2O'). */
  spoken: string;
  /** Null: nothing charted yet; both buttons open the keypad. */
  value: number | null;
  /** How the value is written ('0.60'), or what is being typed. */
  text: string;
  /** Ordered limits in this field's unit: holding a button stops at each. */
  limits?: readonly number[];
  onChange: (value: number) => void;
  /** The number was touched, or a digit typed on it: open the keypad, with that digit as its first. */
  onKeypad: (firstKey?: string) => void;
  /** The keypad is open for this field. */
  typing?: boolean;
}

/** A setting: one step down, the number (touch it for the keypad), one step up. 204 × 56. */
export function Stepper(props: StepperProps) {
  const { label, spoken, value, text, onChange, onKeypad, limits = [], typing = false } = props;
  const stepTo = (direction: 1 | -1) => (value === null ? null : nextValue(value, direction, props));
  const press = (direction: 1 | -1) => {
    const next = stepTo(direction);
    if (next === null) onKeypad();
    else if (next !== value) onChange(next);
  };
  const repeat = (direction: 1 | -1) => {
    const next = stepTo(direction);
    if (next === null || value === null || next === value || passesLimit(value, next, limits)) return false;
    onChange(next);
    return true;
  };
  const hold = useHoldToRepeat({ press, repeat });
  return (
    <div role="group" aria-label={label} className="flex h-14 w-[204px] shrink-0 items-stretch">
      <StepButton label={`${label}, less`} sign="−" {...hold(-1)} />
      <div
        role="spinbutton"
        tabIndex={0}
        aria-label={label}
        aria-valuenow={value ?? undefined}
        aria-valuetext={value === null ? "not charted" : spoken}
        aria-valuemin={props.min}
        aria-valuemax={props.max}
        onClick={() => onKeypad()}
        onKeyDown={(event) => stepByKey(event, press, onKeypad)}
        className={`grid flex-1 cursor-pointer place-items-center rounded-[8px] text-ink ${typing ? "outline-[2.5px] outline-accent" : ""}`}
      >
        <Quantity text={text} className="n-step" />
      </div>
      <StepButton label={`${label}, more`} sign="+" {...hold(1)} />
    </div>
  );
}

function StepButton({ label, sign, ...on }: { label: string; sign: string } & Record<`on${string}`, () => void>) {
  return (
    <button
      type="button"
      aria-label={label}
      tabIndex={-1}
      onContextMenu={(event) => event.preventDefault()}
      className="w-[58px] touch-manipulation rounded-[8px] text-[28px] leading-none font-[640] control text-accent select-none"
      {...on}
    >
      <span aria-hidden="true">{sign}</span>
    </button>
  );
}

function stepByKey(event: KeyboardEvent, press: (direction: 1 | -1) => void, onKeypad: (firstKey?: string) => void) {
  if (event.ctrlKey || event.metaKey || event.altKey) return;
  if (event.key === "ArrowUp" || event.key === "ArrowDown") {
    event.preventDefault();
    press(event.key === "ArrowUp" ? 1 : -1);
  } else if (/^[0-9.,]$/.test(event.key)) {
    event.preventDefault();
    onKeypad(event.key === "," ? "." : event.key);
  } else if (event.key === "Enter" || event.key === " ") {
    event.preventDefault();
    onKeypad();
  }
}
