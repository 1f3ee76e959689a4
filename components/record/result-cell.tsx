import type { ReactNode } from "react";
import { Quantity } from "@/components/figures/quantity";
import { StateWord } from "@/components/figures/state-word";
import { Subscripted } from "@/components/figures/subscripted";
import type { ResultWords } from "./result-words";
import styles from "./record.module.css";

interface ResultCellProps {
  name: string;
  /** Stands before the number ('ΔP'). */
  before?: ReactNode;
  words: ResultWords;
}

/** One worked-out number over its shape and word, as they are while a person types. */
export function ResultCell({ name, before, words }: ResultCellProps) {
  const { number, unit, state, was, aside, lastOutsideAt } = words;
  const size = (number ?? "").length >= 4 ? styles.numberLong : styles.number;
  return (
    <div role="group" aria-label={name} className="min-w-0 leading-tight tablet:flex tablet:items-center tablet:gap-4">
      <p className="flex flex-wrap items-baseline gap-x-1.5 whitespace-nowrap">
        {before}
        {number !== null ? (
          <>
            <Quantity text={number} className={`${size} leading-[1.1] font-bold`} />
            <span className="t-label text-muted">
              <Subscripted text={unit} />
            </span>
          </>
        ) : (
          was !== null && (
            <span className="t-label text-muted">
              was <Quantity text={was} className="text-[20px]" />
            </span>
          )
        )}
      </p>
      <p className="flex flex-wrap items-center gap-x-2">
        <StateWord state={state} shape {...(lastOutsideAt && { lastOutsideAt })} />
        {aside && <span className={`${styles.long} t-label text-muted`}>{aside}</span>}
      </p>
    </div>
  );
}
