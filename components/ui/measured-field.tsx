"use client";

import { useId } from "react";

export interface MeasuredFieldProps {
  label: string;
  /** What the person typed; empty until then. The last value never stands in here. */
  text: string;
  onChange: (text: string) => void;
  /** Focused or touched: open the keypad for it. */
  onOpen: () => void;
  /** The keypad is open for this field. */
  typing?: boolean;
  /** The right half, where a reading needs a word ('hold?' until one is chosen). */
  word?: { text: string; chosen: boolean; onOpen: () => void };
  error?: string;
}

/** A field for a measured number, 204 × 56, split where a word belongs to it. The system's keyboard stays closed. */
export function MeasuredField({ label, text, onChange, onOpen, typing = false, word, error }: MeasuredFieldProps) {
  const id = useId();
  return (
    <div className="w-[204px] shrink-0">
      <div className="flex h-14 rounded-[8px] control">
        <input
          aria-label={label}
          aria-invalid={error ? true : undefined}
          aria-describedby={error ? id : undefined}
          inputMode="none"
          autoComplete="off"
          value={text}
          onChange={(event) => onChange(event.target.value.replace(",", "."))}
          onFocus={onOpen}
          onClick={onOpen}
          className={`min-w-0 flex-1 rounded-[7px] bg-transparent text-center nums text-[32px] font-bold text-ink ${typing ? "outline-[2.5px] outline-accent" : ""}`}
        />
        {word && (
          <button
            type="button"
            aria-label={`${label}, how the hold was: ${word.chosen ? word.text : "not said"}`}
            onClick={word.onOpen}
            className={`w-[102px] border-l-[1.5px] px-1 text-[16px] ${word.chosen ? "border-rule font-[640] text-ink" : "border-dashed border-rule text-muted"}`}
          >
            {word.text}
          </button>
        )}
      </div>
      {error && (
        <p id={id} className="mt-1 t-label font-[560] text-outside">
          {error}
        </p>
      )}
    </div>
  );
}
