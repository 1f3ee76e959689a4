"use client";

import { useEffect, useRef } from "react";
import { Keypad, type KeypadProps } from "@/components/ui/keypad";
import { holdQualities } from "@/lib/contracts";
import type { NumericSettingField } from "@/lib/physiology";
import {
  mechanicsStyles,
  observationStyles,
  settingStyles,
  type MechanicsNumber,
  type ObservationNumber,
} from "./form-fields";
import { focusHoldWord } from "./hold-focus";
import { holdWords } from "./hold-words";
import type { TypingTarget } from "./typing";
import { useRecord } from "./use-record";
import styles from "./record.module.css";

const holds: KeypadProps["choices"] = holdQualities.map((value) => ({
  value,
  words: holdWords[value],
  apart: value === "not-possible",
}));

/** The keypad of the field being typed into; beside a plateau's digits, how the hold was. */
export function EntryKeypad() {
  const { typing, editing } = useRecord();
  const { target } = typing;
  useCloseBeside(target !== null, typing.close);
  useShowField(target);
  if (!target) return null;
  const isPlateau = target.field === "plateauCmH2O";
  return (
    // The field keeps the focus, and its cursor, while its digits are touched.
    <div
      className={styles.keypad}
      data-over={target.part === "settings" ? "measured" : "settings"}
      data-keypad-zone
      onMouseDown={(event) => event.preventDefault()}
    >
      <Keypad
        label={labelOf(target)}
        text={typing.text}
        onChange={typing.type}
        onClose={typing.close}
        {...(isPlateau && { choices: holds, onChoose: choose })}
      />
    </div>
  );

  function choose(hold: string) {
    editing.set("hold", holdQualities.find((each) => each === hold) ?? null);
    typing.close();
    focusHoldWord();
  }
}

function labelOf({ part, field }: TypingTarget): string {
  if (part === "settings") return settingStyles[field as NumericSettingField].label;
  if (part === "mechanics") return mechanicsStyles[field as MechanicsNumber].label;
  return observationStyles[field as ObservationNumber].label;
}

const zones = "[data-keypad-zone], [data-record-foot], [data-field] :is(input, button, [role=spinbutton])";

/**
 * There is no OK key: a touch on anything that is not typed into closes the keypad. Where it began counts, not where it
 * ended: opening the keypad moves the page under the finger.
 */
function useCloseBeside(open: boolean, close: () => void) {
  const began = useRef<EventTarget | null>(null);
  useEffect(() => {
    const begin = (event: PointerEvent) => {
      began.current = event.target;
    };
    document.addEventListener("pointerdown", begin, true);
    return () => document.removeEventListener("pointerdown", begin, true);
  }, []);
  useEffect(() => {
    if (!open) return;
    const leave = (event: MouseEvent) => {
      const touched = began.current ?? event.target;
      began.current = null;
      if (touched instanceof Element && !touched.closest(zones)) close();
    };
    document.addEventListener("click", leave);
    return () => document.removeEventListener("click", leave);
  }, [open, close]);
}

/** The keypad covers the lower half of a phone: the field it types into moves above it. */
function useShowField(target: TypingTarget | null) {
  const name = target && `${target.part}.${target.field}`;
  useEffect(() => {
    if (!name) return;
    const show = () => document.querySelector(`[data-field="${name}"]`)?.scrollIntoView?.({ block: "nearest" });
    // Once the keypad stands and the page has reserved its height.
    const timer = setTimeout(show, 60);
    return () => clearTimeout(timer);
  }, [name]);
}
