"use client";

import { setNonce } from "get-nonce";
import { ThemeProvider } from "next-themes";
import type { ReactNode } from "react";
import { AnnouncerProvider } from "@/components/ui/announcer";
import { DemoProvider } from "./demo-chip";

export interface AppFrameProps {
  /** The request's nonce; without it the theme's script and the dialogs' styles are refused by the page's policy. */
  nonce?: string;
  demo: boolean;
  children: ReactNode;
}

/** What every page stands in: the theme (`data-theme`, day or night), the announcer, and whether this is the demo. */
export function AppFrame({ nonce, demo, children }: AppFrameProps) {
  if (nonce !== undefined) setNonce(nonce);
  return (
    <ThemeProvider
      attribute="data-theme"
      themes={["day", "night"]}
      defaultTheme="day"
      enableSystem={false}
      enableColorScheme={false}
      nonce={nonce}
    >
      <DemoProvider value={demo}>
        <AnnouncerProvider>{children}</AnnouncerProvider>
      </DemoProvider>
    </ThemeProvider>
  );
}
