"use client";

import { useState } from "react";
import { tellOtherTabs } from "./session-channel";
import { signInHere, type Credentials } from "./sign-in";
import { useCountdown } from "./use-countdown";

/** One sign-in form: whether it is sending, why it was refused, and how long the next try has to wait. */
export function useSignIn(onSignedIn: () => void | Promise<void>) {
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string>();
  const wait = useCountdown();
  const submit = async (credentials: Credentials) => {
    setBusy(true);
    setProblem(undefined);
    const answer = await signInHere(credentials);
    if (answer.ok) {
      tellOtherTabs();
      await onSignedIn();
    } else {
      setProblem(answer.refusal);
      wait.start(answer.waitSeconds);
    }
    setBusy(false);
  };
  return { busy, problem, waitSeconds: wait.seconds, submit };
}
