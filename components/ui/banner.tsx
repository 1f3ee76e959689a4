import type { ReactNode } from "react";

export interface BannerProps {
  title: string;
  children?: ReactNode;
  actions?: ReactNode;
}

/** What is not yet on record ('Kept on this device'): violet, behind a dashed bar, as everything unmeasured is. */
export function Banner({ title, children, actions }: BannerProps) {
  return (
    <section role="status" className="flex gap-4 border-b border-hair bg-unm-soft px-4 py-4 tablet:px-6">
      <div aria-hidden="true" className="relative w-2.5 shrink-0">
        <svg className="absolute inset-0 h-full w-full">
          <line x1="5" x2="5" y1="0" y2="100%" stroke="var(--unm)" strokeWidth="10" strokeDasharray="10 6" />
        </svg>
      </div>
      <div className="min-w-0 flex-1">
        <h2 className="t-title text-ink">{title}</h2>
        {children && <div className="t-body text-ink">{children}</div>}
      </div>
      {actions && <div className="flex shrink-0 items-center gap-3">{actions}</div>}
    </section>
  );
}
