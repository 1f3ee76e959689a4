import type { ReactNode } from "react";

/** What went wrong, in a sentence, read aloud at once. */
export function ErrorNote({ children, action }: { children: ReactNode; action?: ReactNode }) {
  return (
    <div
      role="alert"
      className="flex flex-wrap items-center gap-x-4 gap-y-2 border-l-4 border-outside bg-outside-soft px-3 py-2"
    >
      <p className="t-small font-[560] text-outside">{children}</p>
      {action}
    </div>
  );
}
