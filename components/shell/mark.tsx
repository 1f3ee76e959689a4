/** The mark: three bars between two lines, each shorter than the one before: a tide made small. */
export function Mark() {
  return (
    <svg width="26" height="20" viewBox="0 0 26 20" aria-hidden="true" className="shrink-0">
      <path d="M0 1H26M0 19H26" stroke="var(--rule)" strokeWidth="1.5" />
      <rect x="3" y="1" width="5" height="18" fill="var(--band)" />
      <rect x="11" y="4" width="5" height="12" fill="var(--accent)" />
      <rect x="18.5" y="6.5" width="5" height="7" fill="var(--accent)" />
    </svg>
  );
}

/** Mark and wordmark. */
export function Wordmark() {
  return (
    <span className="inline-flex items-center gap-2.5">
      <Mark />
      <span className="text-[20px] leading-none font-[680] text-ink">Neaptide</span>
    </span>
  );
}
