import type { ReactNode } from "react";
import { Subscripted } from "@/components/figures/subscripted";
import styles from "./record.module.css";

interface FieldRowProps {
  label: string;
  /** 'mechanics.plateauCmH2O': found by this when the keypad opens for it. */
  name?: string;
  /** Second line: unit, and what it was. */
  sub?: ReactNode;
  /** Changed or measured in this entry: a bar at the left. */
  bar?: "accent" | "outside" | null;
  tall?: boolean;
  error?: string | undefined;
  errorId?: string;
  children: ReactNode;
}

/** One row of the form: label and unit, then the control; a refusal stands under both, in full. */
export function FieldRow({ label, name, sub, bar = null, tall = false, error, errorId, children }: FieldRowProps) {
  return (
    <div data-field={name} className="relative -mx-4 px-4 rule-row tablet:mx-0 tablet:px-0">
      {bar && (
        <span
          aria-hidden="true"
          className={`absolute inset-y-1 left-0 w-1 tablet:-left-2.5 ${bar === "outside" ? "bg-outside" : "bg-accent"}`}
        />
      )}
      <div
        className={`${styles.row} flex items-center gap-2 ${tall ? "min-h-[71px] tablet:min-h-[63px]" : "min-h-[63px]"}`}
      >
        <div className={`${styles.rowLabel} min-w-0 flex-1 leading-tight`}>
          <span className="block text-[17px] font-[620]">
            <Subscripted text={label} />
          </span>
          {sub && <span className="block t-label text-muted">{sub}</span>}
        </div>
        {children}
      </div>
      {error && (
        <p id={errorId} role="alert" className="pb-2 t-small font-[560] text-outside">
          <Subscripted text={error} />
        </p>
      )}
    </div>
  );
}
