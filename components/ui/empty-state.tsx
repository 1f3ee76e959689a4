import type { ReactNode } from "react";

/** Nothing here yet, and what would put something here. */
export function EmptyState({ title, children, action }: { title: string; children?: ReactNode; action?: ReactNode }) {
  return (
    <section className="page-margin py-12">
      <h2 className="t-title">{title}</h2>
      {children && <div className="mt-2 max-w-[60ch] t-body text-muted">{children}</div>}
      {action && <div className="mt-5">{action}</div>}
    </section>
  );
}
