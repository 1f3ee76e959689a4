"use client";

import { ErrorMessage } from "@/components/shell/messages";

export default function PageError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return <ErrorMessage reference={error.digest} onRetry={reset} />;
}
