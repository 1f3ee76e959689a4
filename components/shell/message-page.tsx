import type { ReactNode } from "react";
import { cautionLine } from "./cautions";
import { DemoChip } from "./demo-chip";
import { Wordmark } from "./mark";
import { NeapDrawing } from "./neap-drawing";

export interface MessagePageProps {
  title: string;
  children: ReactNode;
  /** Where to go from here. */
  actions?: ReactNode;
}

/** A page that has only something to say: forbidden, not found, failed. */
export function MessagePage({ title, children, actions }: MessagePageProps) {
  return (
    <div className="flex min-h-dvh flex-col overflow-hidden">
      <header className="flex h-13 items-center gap-3 border-b border-hair page-margin">
        <Wordmark />
        <DemoChip />
      </header>
      <main className="flex flex-1 flex-col page-margin pt-12">
        <h1 className="t-display max-tablet:text-[32px]">{title}</h1>
        <div className="mt-4 max-w-[56ch] t-body text-muted">{children}</div>
        {actions && <div className="mt-6 flex flex-wrap gap-3">{actions}</div>}
        <NeapDrawing className="mt-auto max-w-[460px] pt-10 opacity-60" />
      </main>
      <footer className="border-t border-hair page-margin py-2 t-label">{cautionLine}</footer>
    </div>
  );
}
