"use client";

import { cautionLine } from "./cautions";
import { useDemo } from "./demo-chip";

/** Pinned at the foot, 28 tall, 24 on a tablet; on a phone it stands at the end of the page, where it may wrap. */
export function CautionLine() {
  const demo = useDemo();
  return (
    <footer className="z-20 flex shrink-0 items-center justify-between gap-6 border-t border-hair bg-paper page-margin py-3 t-label text-ink tablet:sticky tablet:bottom-0 tablet:h-6 tablet:py-0 tablet:whitespace-nowrap desk:h-7">
      <p className="min-w-0 tablet:truncate">{cautionLine}</p>
      {demo && <p className="hidden shrink-0 text-muted desk:block">Demo data, invented people</p>}
    </footer>
  );
}
