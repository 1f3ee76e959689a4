"use client";

import { Button } from "@/components/ui/button";
import { ErrorNote } from "@/components/ui/error-note";
import { TextField } from "@/components/ui/text-field";
import { useState, type FormEvent } from "react";

export interface LockPanelProps {
  /** 'M. Okafor, RT' */
  name: string;
  onUnlock: (password: string) => void;
  onSomeoneElse: () => void;
  busy: boolean;
  /** Seconds until the next try is allowed; the button counts them down. */
  waitSeconds?: number;
  problem?: string | undefined;
}

/** The page is locked after idling: this person's password, or someone else. What was typed underneath is kept. */
export function LockPanel({ name, onUnlock, onSomeoneElse, busy, waitSeconds = 0, problem }: LockPanelProps) {
  const [password, setPassword] = useState("");
  const submit = (event: FormEvent) => {
    event.preventDefault();
    onUnlock(password);
  };
  return (
    <>
      <h1 className="text-[28px] leading-tight font-[700]">Locked</h1>
      <p className="mt-2 t-body text-muted">
        Nobody touched this page for 15 min. What was typed is kept for <b className="font-[640] text-ink">{name}</b>.
      </p>
      <form onSubmit={submit} className="mt-5 flex flex-col gap-4">
        <TextField
          label={`Password of ${name}`}
          type="password"
          name="password"
          autoComplete="current-password"
          autoFocus
          required
          value={password}
          onChange={(event) => setPassword(event.target.value)}
        />
        {problem && <ErrorNote>{problem}</ErrorNote>}
        <Button type="submit" look="primary" size="door" disabled={busy || waitSeconds > 0} className="w-full">
          {waitSeconds > 0 ? `Wait ${waitSeconds} s` : busy ? "Unlocking" : "Unlock"}
        </Button>
        <Button size="entry" onClick={onSomeoneElse} disabled={busy} className="w-full">
          Someone else
        </Button>
      </form>
    </>
  );
}
