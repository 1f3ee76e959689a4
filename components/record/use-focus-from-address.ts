"use client";

import { useEffect } from "react";

/** Where the form is opened: a part of it, a field of it, or just its top. */
export type FormFocus = string | null;

function placeOf(focus: string): HTMLElement | null {
  if (focus === "settings" || focus === "height") return null;
  const row =
    focus === "measurements"
      ? document.querySelector<HTMLElement>('[data-field^="mechanics."], [data-field^="observations."]')
      : document.querySelector<HTMLElement>(`[data-field$=".${CSS.escape(focus)}"]`);
  return row?.querySelector<HTMLElement>("input, [role=spinbutton]") ?? null;
}

/** Brings the field that was asked for into view, ready for typing. */
export function useFocusFromAddress(focus: FormFocus) {
  useEffect(() => {
    if (!focus) return;
    const frame = requestAnimationFrame(() => {
      const place = placeOf(focus);
      place?.focus({ preventScroll: true });
      place?.scrollIntoView?.({ block: "center" });
    });
    return () => cancelAnimationFrame(frame);
  }, [focus]);
}
