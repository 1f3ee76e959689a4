"use client";

import { FieldRow } from "./field-row";

interface YesNoRowProps {
  label: string;
  sub?: string;
  yes: string;
  no: string;
  value: boolean | null;
  /** Null: not said; pressing what is chosen takes it back. */
  onChange: (value: boolean | null) => void;
}

/** Something seen or not seen, and neither until it is said. */
export function YesNoRow({ label, sub, yes, no, value, onChange }: YesNoRowProps) {
  return (
    <FieldRow label={label} sub={sub} bar={value === null ? null : "accent"}>
      <div role="group" aria-label={label} className="flex w-[204px] shrink-0 gap-2">
        {[true, false].map((each) => (
          <button
            key={String(each)}
            type="button"
            aria-pressed={value === each}
            onClick={() => onChange(value === each ? null : each)}
            className={`min-h-14 flex-1 rounded-[8px] border-[1.5px] px-1 text-[16px] font-[620] ${value === each ? "border-2 border-accent bg-accent-soft text-ink" : "border-rule bg-surface text-ink"}`}
          >
            {value === each && <span aria-hidden="true">✓ </span>}
            {each ? yes : no}
          </button>
        ))}
      </div>
    </FieldRow>
  );
}
