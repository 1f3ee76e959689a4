/** The Δ of driving pressure. Neither typeface has the letter, so it is drawn, and spoken as a word. */
export function DeltaP({ className = "" }: { className?: string }) {
  return (
    <span className={`inline-flex items-baseline whitespace-nowrap ${className}`}>
      <svg
        role="img"
        aria-label="driving pressure, delta "
        viewBox="0 0 12 12"
        className="mr-[.06em] inline h-[.72em] w-[.78em]"
      >
        <path d="M6 1.6L10.9 11H1.1Z" fill="none" stroke="currentColor" strokeWidth="1.7" strokeLinejoin="miter" />
      </svg>
      P
    </span>
  );
}
