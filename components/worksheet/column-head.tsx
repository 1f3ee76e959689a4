import { Subscripted } from "@/components/figures/subscripted";

/** Head of one of the sheet's columns: its name, and what stands at the right of each row. */
export function ColumnHead({ title, aside }: { title: string; aside?: string }) {
  return (
    <div className="flex h-[34px] items-center justify-between gap-2 rule-head">
      <h2 className="t-head">{title}</h2>
      {aside && (
        <span className="t-label text-muted">
          <Subscripted text={aside} />
        </span>
      )}
    </div>
  );
}
