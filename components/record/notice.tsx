import type { ReactNode } from "react";

interface NoticeProps {
  tone?: "edge" | "unm" | "plain";
  children: ReactNode;
  action?: ReactNode;
}

const tones = { edge: "bg-edge-soft", unm: "bg-unm-soft", plain: "bg-paper" };

/** A sentence above the form that bears on what is about to be saved. */
export function Notice({ tone = "edge", children, action }: NoticeProps) {
  return (
    <div
      role="status"
      className={`flex flex-wrap items-center justify-between gap-x-4 gap-y-1 border-b border-hair px-4 py-2 tablet:px-6 desk:px-8 ${tones[tone]}`}
    >
      <p className="min-w-[200px] flex-1 t-body">{children}</p>
      {action}
    </div>
  );
}
