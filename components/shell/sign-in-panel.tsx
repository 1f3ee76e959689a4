"use client";

import { Button } from "@/components/ui/button";
import { ErrorNote } from "@/components/ui/error-note";
import { TextField } from "@/components/ui/text-field";
import { useState, type FormEvent } from "react";
import { DemoPeople, type DemoPerson } from "./demo-people";

export interface SignInPanelProps {
  onSignIn: (who: { email: string; password: string }) => void;
  busy: boolean;
  /** Why it was refused, a whole sentence. */
  problem?: string;
  /** In the demo only. */
  demo?: { people: readonly DemoPerson[]; password: string };
}

/** The form of the sign-in page. */
export function SignInPanel({ onSignIn, busy, problem, demo }: SignInPanelProps) {
  const [email, setEmail] = useState("");
  const [password, setPassword] = useState("");
  const submit = (event: FormEvent) => {
    event.preventDefault();
    onSignIn({ email: email.trim(), password });
  };
  const fill = (person: DemoPerson) => {
    setEmail(person.email);
    setPassword(demo?.password ?? "");
  };
  return (
    <>
      <h1 className="text-[28px] leading-tight font-[700]">Sign in</h1>
      <form onSubmit={submit} className="mt-3 flex flex-col gap-4">
        <TextField
          label="E-mail"
          type="email"
          name="email"
          autoComplete="username"
          required
          value={email}
          onChange={(event) => setEmail(event.target.value)}
        />
        <TextField
          label="Password"
          type="password"
          name="password"
          autoComplete="current-password"
          required
          value={password}
          onChange={(event) => setPassword(event.target.value)}
        />
        {problem && <ErrorNote>{problem}</ErrorNote>}
        <Button type="submit" look="primary" size="save" disabled={busy} className="w-full rounded-[6px]">
          {busy ? "Signing in" : "Sign in"}
        </Button>
      </form>
      <p className="mt-2 text-muted t-label">Locked after 15 min idle; typing is kept</p>
      {demo && <DemoPeople people={demo.people} filled={email} onFill={fill} />}
    </>
  );
}
