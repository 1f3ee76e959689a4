"use client";

import { Delete } from "lucide-react";
import { useEffect } from "react";
import { keypadKey, typedText, type KeypadKey } from "./typed-text";

interface KeypadChoice {
  value: string;
  words: string;
  /** Set apart from those above it ('not possible'). */
  apart?: boolean;
}

export interface KeypadProps {
  /** Which field it types into, read aloud ('Plateau, cmH2O'). */
  label: string;
  text: string;
  onChange: (text: string) => void;
  /** Words beside the digits, one a row, none chosen beforehand; without them the column stays empty. */
  choices?: readonly KeypadChoice[];
  onChoose?: (value: string) => void;
  /** Escape or Enter; there is no OK key. */
  onClose: () => void;
  /** Characters that the field holds. */
  most?: number;
}

const keys: KeypadKey[] = ["1", "2", "3", "4", "5", "6", "7", "8", "9", ".", "0", "backspace"];

/** Digits as large as a gloved finger needs: columns 88 88 88 126, four rows of 56. A real keyboard types too. */
export function Keypad(props: KeypadProps) {
  const { label, text, onChange, choices = [], onChoose, onClose, most = 6 } = props;
  const press = (key: KeypadKey) => onChange(typedText(text, key, most));
  useRealKeyboard(press, onClose);
  return (
    <div
      role="group"
      aria-label={`Keypad, ${label}`}
      className="grid w-full grid-cols-[88fr_88fr_88fr_126fr] border-t border-rule bg-surface"
    >
      <div className="col-span-3 grid grid-cols-3">
        {keys.map((key) => (
          <button
            key={key}
            type="button"
            aria-label={key === "backspace" ? "Delete the last digit" : key === "." ? "Point" : key}
            onClick={() => press(key)}
            className="flex h-14 touch-manipulation items-center justify-center border-r border-b border-hair nums text-[30px] font-bold text-ink select-none"
          >
            {key === "backspace" ? <Delete aria-hidden="true" size={30} strokeWidth={1.75} /> : key}
          </button>
        ))}
      </div>
      <div className="grid grid-rows-4 border-l border-rule bg-paper">
        {choices.map(({ value, words, apart = false }) => (
          <button
            key={value}
            type="button"
            onClick={() => onChoose?.(value)}
            className={`h-14 touch-manipulation border-b border-hair px-1 text-[17px] font-[640] ${apart ? "border-t-[1.5px] border-t-rule font-[560] text-ink" : "text-accent"}`}
          >
            {words}
          </button>
        ))}
      </div>
    </div>
  );
}

/** Digits typed anywhere but into a field of their own reach the keypad while it is open. */
function useRealKeyboard(press: (key: KeypadKey) => void, onClose: () => void) {
  useEffect(() => {
    const listen = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return;
      if (event.key === "Escape") return onClose();
      const key = keypadKey(event.key);
      if (key === null || takesText(event.target)) return;
      event.preventDefault();
      press(key);
    };
    window.addEventListener("keydown", listen);
    return () => window.removeEventListener("keydown", listen);
  }, [press, onClose]);
}

function takesText(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && target.matches("input, textarea, select, [contenteditable]");
}
