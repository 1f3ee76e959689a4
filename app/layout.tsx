import type { Metadata, Viewport } from "next";
import { headers } from "next/headers";
import type { ReactNode } from "react";
import { AppFrame } from "@/components/shell/app-frame";
import { env } from "@/lib/env";
import { fontVariables } from "./fonts";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Neaptide", template: "%s, Neaptide" },
  description: "A bedside worksheet for ventilator settings and lung protection.",
  robots: { index: false, follow: false },
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  themeColor: "#F6F4EE",
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  // Read first: it makes every page dynamic, as a nonce must be, and keeps the environment out of the build.
  const nonce = (await headers()).get("x-nonce") ?? undefined;
  return (
    <html lang="en" data-theme="day" className={fontVariables} suppressHydrationWarning>
      <body>
        <AppFrame nonce={nonce} demo={env().NEAPTIDE_MODE !== "production"}>
          {children}
        </AppFrame>
      </body>
    </html>
  );
}
