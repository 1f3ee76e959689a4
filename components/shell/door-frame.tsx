import type { ReactNode } from "react";
import { cautionFull } from "./cautions";
import { DemoChip } from "./demo-chip";
import { Wordmark } from "./mark";
import { NeapDrawing } from "./neap-drawing";

/** What stands before the patients: sign-in and the lock. Drawing on the left, the panel and the caution on the right. */
export function DoorFrame({ children }: { children: ReactNode }) {
  return (
    <main className="flex min-h-dvh flex-col tablet:flex-row">
      <section className="flex flex-1 flex-col overflow-hidden px-4 pt-4 tablet:px-12 tablet:pt-11 desk:px-16">
        <div className="flex items-center gap-3">
          <Wordmark />
          <DemoChip />
        </div>
        <p className="mt-9 hidden t-display text-ink tablet:block desk:text-[46px]">
          The tide with
          <br />
          the smallest rise.
        </p>
        <p className="mt-3 mb-4 max-w-[30ch] t-body text-muted tablet:max-w-[400px] tablet:text-[18px]">
          A bedside worksheet for ventilator settings and lung protection.
        </p>
        <NeapDrawing className="mt-auto hidden max-w-[708px] tablet:block" />
      </section>
      <section className="flex flex-col justify-center border-hair bg-surface px-4 py-6 tablet:w-[428px] tablet:border-l tablet:px-11 tablet:py-3 desk:w-[602px] desk:px-[84px]">
        {children}
        <div className="mt-5 border-t-2 border-ink pt-3 t-small text-ink">
          <p className="font-[640]">{cautionFull.lead}</p>
          <p>{cautionFull.rest}</p>
        </div>
      </section>
    </main>
  );
}
