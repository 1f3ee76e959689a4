"use client";

import { useState } from "react";
import { AppError, sessionAnswerSchema } from "@/lib/contracts";
import { request } from "./api";
import { tellOtherTabs } from "./session-channel";
import { useCountdown } from "./use-countdown";

/** The lock screen's form: this person's password opens the session again. */
export function useUnlock(onOpened: () => Promise<void>) {
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string>();
  const wait = useCountdown();
  const submit = async (password: string) => {
    setBusy(true);
    setProblem(undefined);
    try {
      await request({ path: "/api/session/unlock", answer: sessionAnswerSchema, body: { password } });
      tellOtherTabs();
      await onOpened();
    } catch (error) {
      setProblem(error instanceof Error ? error.message : "Unlocking failed. Try again.");
      if (error instanceof AppError) wait.start(Number(error.headers["Retry-After"] ?? 0));
    } finally {
      setBusy(false);
    }
  };
  return { busy, problem, waitSeconds: wait.seconds, submit };
}
