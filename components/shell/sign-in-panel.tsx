"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useForm, useWatch } from "react-hook-form";
import type { z } from "zod";
import { Button } from "@/components/ui/button";
import { ErrorNote } from "@/components/ui/error-note";
import { TextField } from "@/components/ui/text-field";
import { signInSchema } from "@/lib/contracts";
import { DemoPeople, type DemoPerson } from "./demo-people";

type Credentials = z.output<typeof signInSchema>;

export interface SignInPanelProps {
  onSignIn: (who: Credentials) => void | Promise<void>;
  busy: boolean;
  /** Seconds until the next try is allowed; the button counts them down. */
  waitSeconds?: number;
  /** Why it was refused, a whole sentence. */
  problem?: string | undefined;
  title?: string;
  /** In the demo only. */
  demo?: { people: readonly DemoPerson[]; password: string } | undefined;
}

function buttonWords(busy: boolean, waitSeconds: number): string {
  if (waitSeconds > 0) return `Wait ${waitSeconds} s`;
  return busy ? "Signing in" : "Sign in";
}

/** The form of the sign-in page. */
export function SignInPanel({ onSignIn, busy, waitSeconds = 0, problem, title = "Sign in", demo }: SignInPanelProps) {
  const { register, handleSubmit, formState, setValue, control } = useForm<Credentials>({
    resolver: zodResolver(signInSchema),
    defaultValues: { email: "", password: "" },
  });
  const filled = useWatch({ control, name: "email" });
  const { errors } = formState;
  const fill = (person: DemoPerson) => {
    setValue("email", person.email, { shouldValidate: formState.isSubmitted });
    setValue("password", demo?.password ?? "", { shouldValidate: formState.isSubmitted });
  };
  return (
    <>
      <h1 className="text-[28px] leading-tight font-[700]">{title}</h1>
      <form noValidate onSubmit={handleSubmit(onSignIn)} className="mt-3 flex flex-col gap-3 desk:gap-4">
        <TextField
          label="E-mail"
          type="email"
          autoComplete="username"
          {...(errors.email?.message && { error: errors.email.message })}
          {...register("email", { setValueAs: (typed: string) => typed.trim() })}
        />
        <TextField
          label="Password"
          type="password"
          autoComplete="current-password"
          {...(errors.password?.message && { error: errors.password.message })}
          {...register("password")}
        />
        {problem && <ErrorNote>{problem}</ErrorNote>}
        <Button type="submit" look="primary" size="door" disabled={busy || waitSeconds > 0} className="w-full">
          {buttonWords(busy, waitSeconds)}
        </Button>
      </form>
      <p className="mt-2 t-label text-muted">Locked after 15 min idle; typing is kept</p>
      {demo && <DemoPeople people={demo.people} filled={filled} onFill={fill} />}
    </>
  );
}
