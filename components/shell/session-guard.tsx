"use client";

import { useQueryClient } from "@tanstack/react-query";
import { signOut } from "next-auth/react";
import dynamic from "next/dynamic";
import { Dialog } from "radix-ui";
import type { ReactNode } from "react";
import { useSessionWatch } from "@/lib/client/use-session-watch";
import { useSignIn } from "@/lib/client/use-sign-in";
import { useUnlock } from "@/lib/client/use-unlock";
import type { Me } from "@/lib/contracts";
import { DoorFrame } from "./door-frame";
import { LockPanel } from "./lock-panel";

// Signing in needs the network anyway; its form is fetched when a session has ended. The lock's form never waits for one.
const SignInPanel = dynamic(() => import("./sign-in-panel").then((part) => part.SignInPanel), { ssr: false });

const leave = () => void signOut({ callbackUrl: "/sign-in" });

interface SessionGuardProps {
  me: Me;
  children: ReactNode;
}

/**
 * Stands around every page of a signed-in person. Locked or ended, the door covers the page; what was typed stays
 * mounted beneath it, and only its own person gets it back.
 */
export function SessionGuard({ me, children }: SessionGuardProps) {
  const client = useQueryClient();
  const { loss, endsInMinutes, reopen } = useSessionWatch(me.user.id, me.session);
  const opened = async () => {
    await reopen();
    await client.invalidateQueries();
  };
  return (
    <>
      <div className={loss === null ? "contents" : "invisible contents"}>
        {endsInMinutes !== null && <EndsSoon minutes={endsInMinutes} />}
        {children}
      </div>
      {loss === "locked" && (
        <Door title="Locked">
          <Locked name={me.user.name} onOpened={opened} />
        </Door>
      )}
      {loss === "not-signed-in" && (
        <Door title="Signed out">
          <Ended onOpened={opened} />
        </Door>
      )}
    </>
  );
}

/** Over everything, dialogs of the page included; only signing in leads out of it. */
function Door({ title, children }: { title: string; children: ReactNode }) {
  return (
    <Dialog.Root open>
      <Dialog.Portal>
        <Dialog.Content
          aria-describedby={undefined}
          onEscapeKeyDown={(event) => event.preventDefault()}
          onInteractOutside={(event) => event.preventDefault()}
          className="fixed inset-0 z-[100] overflow-y-auto bg-paper"
        >
          <Dialog.Title className="sr-only">{title}</Dialog.Title>
          <DoorFrame>{children}</DoorFrame>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}

function Locked({ name, onOpened }: { name: string; onOpened: () => Promise<void> }) {
  const { submit, ...form } = useUnlock(onOpened);
  return <LockPanel name={name} onUnlock={submit} onSomeoneElse={leave} {...form} />;
}

function Ended({ onOpened }: { onOpened: () => Promise<void> }) {
  const { submit, ...form } = useSignIn(onOpened);
  return <SignInPanel title="Your session has ended" onSignIn={submit} {...form} />;
}

/** Slim, and above the page: what is due at the bedside comes first. */
function EndsSoon({ minutes }: { minutes: number }) {
  return (
    <p role="status" className="border-b-2 border-ink bg-surface page-margin py-2 t-small text-ink">
      <b className="font-[640]">This session ends in {minutes} min.</b> Then it asks for your password; what is typed
      stays on this page.
    </p>
  );
}
