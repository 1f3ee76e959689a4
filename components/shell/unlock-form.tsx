"use client";

import { signOut } from "next-auth/react";
import { useUnlock } from "@/lib/client/use-unlock";
import { LockPanel } from "./lock-panel";

/** The lock as a page of its own, for a page that was asked for while the session was locked. */
export function UnlockForm({ name, target }: { name: string; target: string }) {
  const { submit, ...form } = useUnlock(async () => location.assign(target));
  return (
    <LockPanel
      name={name}
      onUnlock={submit}
      onSomeoneElse={() => void signOut({ callbackUrl: "/sign-in" })}
      {...form}
    />
  );
}
