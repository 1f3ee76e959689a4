"use client";

import { createContext, useCallback, useContext, useState, type ReactNode } from "react";

const AnnouncerContext = createContext<(words: string) => void>(() => undefined);

/** Holds the one polite live region of the page. */
export function AnnouncerProvider({ children }: { children: ReactNode }) {
  const [said, setSaid] = useState({ words: "", times: 0 });
  const announce = useCallback((words: string) => setSaid(({ times }) => ({ words, times: times + 1 })), []);
  return (
    <AnnouncerContext.Provider value={announce}>
      {children}
      <div role="status" aria-live="polite" className="sr-only">
        {/* A new key makes the same words be read again. */}
        <span key={said.times}>{said.words}</span>
      </div>
    </AnnouncerContext.Provider>
  );
}

/** `announce('Saved at 14:22')`: read aloud politely, shown nowhere. */
export function useAnnounce(): (words: string) => void {
  return useContext(AnnouncerContext);
}
