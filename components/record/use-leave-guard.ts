"use client";

import { useEffect, useState } from "react";

/** Where a plain click on a link would lead away from this page; null for any other click. */
function leadsAway(event: MouseEvent): string | null {
  if (event.defaultPrevented || event.button !== 0 || event.metaKey || event.ctrlKey || event.shiftKey) return null;
  const link = event.target instanceof Element ? event.target.closest("a[href]") : null;
  if (!(link instanceof HTMLAnchorElement) || link.target === "_blank") return null;
  const away = new URL(link.href, window.location.href);
  return away.pathname === window.location.pathname ? null : link.href;
}

/**
 * Leaving with unsaved work asks: closing or reloading the tab through the browser's own question, a link on the page
 * through ours. `asked` is where the person was going.
 */
export function useLeaveGuard(unsaved: boolean): { asked: string | null; stay: () => void } {
  const [asked, setAsked] = useState<string | null>(null);
  useEffect(() => {
    if (!unsaved) return;
    const closing = (event: BeforeUnloadEvent) => event.preventDefault();
    const clicking = (event: MouseEvent) => {
      const href = leadsAway(event);
      if (!href) return;
      event.preventDefault();
      event.stopPropagation();
      setAsked(href);
    };
    window.addEventListener("beforeunload", closing);
    document.addEventListener("click", clicking, true);
    return () => {
      window.removeEventListener("beforeunload", closing);
      document.removeEventListener("click", clicking, true);
    };
  }, [unsaved]);
  return { asked, stay: () => setAsked(null) };
}
