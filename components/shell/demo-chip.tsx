"use client";

import { createContext, useContext } from "react";

const DemoContext = createContext(false);

/** Says to everything below whether the people and values are invented. */
export const DemoProvider = DemoContext.Provider;

export function useDemo(): boolean {
  return useContext(DemoContext);
}

/** DEMO, outlined, beside the wordmark or the patient's name; nothing outside the demo. */
export function DemoChip() {
  if (!useDemo()) return null;
  return (
    <span className="rounded-[3px] border-[1.5px] border-rule px-1.5 text-[14px] leading-[20px] font-bold tracking-[.06em] text-ink">
      DEMO
    </span>
  );
}
