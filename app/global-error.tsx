"use client";

import { ErrorMessage } from "@/components/shell/messages";
import { fontVariables } from "./fonts";
import "./globals.css";

/** When even the frame failed: it stands in its own page, in the day's colours. */
export default function GlobalError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <html lang="en" data-theme="day" className={fontVariables}>
      <body>
        <ErrorMessage {...(error.digest && { reference: error.digest })} onRetry={reset} />
      </body>
    </html>
  );
}
