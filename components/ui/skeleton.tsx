export interface SkeletonProps {
  /** What is being fetched, read aloud ('Loading beds'). */
  label: string;
  rows?: number;
  /** Height of a row as a class ('h-[59px]'), so that nothing jumps when the real rows come. */
  rowClass?: string;
}

/** The page's rows as empty hairlines while its numbers are on their way. Nothing in it could be read as a value. */
export function Skeleton({ label, rows = 6, rowClass = "h-[59px]" }: SkeletonProps) {
  return (
    <div role="status" aria-label={label} className="page-margin">
      {Array.from({ length: rows }, (_, index) => (
        <div key={index} aria-hidden="true" className={`flex items-center gap-6 rule-row ${rowClass}`}>
          <span className="h-3 w-1/5 rounded-[3px] bg-hair" />
          <span className="h-3 w-2/5 rounded-[3px] bg-hair" />
          <span className="h-3 w-1/6 rounded-[3px] bg-hair" />
        </div>
      ))}
    </div>
  );
}
