import Link from "next/link";
import type { ReactNode } from "react";
import { Quantity } from "@/components/figures/quantity";
import { Subscripted } from "@/components/figures/subscripted";

interface SheetCellProps {
  label: string;
  /** Age, arithmetic or last value, at the label's right. */
  aside?: ReactNode;
  /** Opens what is behind the number. */
  onOpen?: (() => void) | undefined;
  /** Leads to where the number is charted. */
  href?: string | undefined;
  /** What opening shows, for a screen reader: 'history of PEEP'. */
  opens?: string;
  children: ReactNode;
}

/** One quantity of the sheet: label and aside above, the number and its judgement below. */
export function SheetCell({ label, aside, onOpen, href, opens, children }: SheetCellProps) {
  const body = (
    <>
      <span className="flex min-h-[19px] items-baseline justify-between gap-2 t-label text-muted">
        <span className="shrink-0">
          <Subscripted text={label} />
        </span>
        {aside !== undefined && <span className="truncate text-right">{aside}</span>}
      </span>
      <span className="flex min-h-[30px] flex-wrap items-center gap-x-2">{children}</span>
    </>
  );
  const frame = "block w-full rule-row px-0 py-px text-left min-h-[51px] max-desk:min-h-[53px]";
  if (href) {
    return (
      <Link href={href} className={`${frame} hover:bg-surface`}>
        {body}
        <span className="sr-only">, {opens}</span>
      </Link>
    );
  }
  if (!onOpen) return <div className={frame}>{body}</div>;
  return (
    <button type="button" className={`${frame} hover:bg-surface`} onClick={onOpen} aria-haspopup="dialog">
      {body}
      <span className="sr-only">, {opens}</span>
    </button>
  );
}

/** A number with its unit, in the sheet's size. */
export function SheetNumber({ text, unit }: { text: string; unit: string }) {
  return (
    <span className="whitespace-nowrap">
      <Quantity text={text} className="n-cell" />
      {unit && (
        <span className="ml-1.5 t-body text-muted max-desk:text-[15px]">
          <Subscripted text={unit} />
        </span>
      )}
    </span>
  );
}

/** Where a fresh reading still gives no number: an effort hold, or what cannot be worked out. */
export function NotMeasured({ why }: { why: string | null }) {
  return (
    <span className="inline-flex flex-wrap items-baseline gap-x-2">
      <span className="chip bg-unm-soft t-state text-unm">not measured</span>
      {why && <span className="t-label text-unm">{why}</span>}
    </span>
  );
}
