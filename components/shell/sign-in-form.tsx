"use client";

import { useSignIn } from "@/lib/client/use-sign-in";
import { SignInPanel, type SignInPanelProps } from "./sign-in-panel";

interface SignInFormProps {
  /** A path of ours: where this person wanted to go. */
  target: string;
  demo: SignInPanelProps["demo"];
}

/** The sign-in page's form. It loads the target anew, so that nothing of an earlier person stays in memory. */
export function SignInForm({ target, demo }: SignInFormProps) {
  const { submit, ...form } = useSignIn(() => location.assign(target));
  return <SignInPanel onSignIn={submit} demo={demo} {...form} />;
}
