import { Subscripted } from "@/components/figures/subscripted";

/** Head of a column of the sheet or of a half of the form: its name, and what stands at the right of each row. */
export function ColumnHead({ title, aside }: { title: string; aside?: string }) {
  return (
    <div className="flex h-8 items-center justify-between gap-2 rule-head tablet:h-[34px]">
      <h2 className="t-head">{title}</h2>
      {aside && (
        <span className="t-label text-muted">
          <Subscripted text={aside} />
        </span>
      )}
    </div>
  );
}
