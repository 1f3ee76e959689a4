import { getCsrfToken, signIn } from "next-auth/react";

export interface Credentials {
  email: string;
  password: string;
}

export type SignInAnswer = { ok: true } | { ok: false; refusal: string; waitSeconds: number };

const refused = (refusal: string, waitSeconds = 0): SignInAnswer => ({ ok: false, refusal, waitSeconds });

/** The server puts the wait into the one word that next-auth passes on: `slow-down:4`. */
function answerOf(error: string): SignInAnswer {
  const seconds = Number(/^slow-down:(\d+)$/.exec(error)?.[1] ?? 0);
  if (seconds > 0) return refused("Too many tries in a row. Wait until the button allows the next one.", seconds);
  if (error === "CredentialsSignin") return refused("E-mail and password do not belong together.");
  return refused("Signing in failed on the server. Try again.");
}

/** Signs in without leaving the page, so that what stands under the form is kept. */
export async function signInHere(credentials: Credentials): Promise<SignInAnswer> {
  // Asked first: where the server cannot be reached next-auth would leave the page.
  if (!(await getCsrfToken())) return refused("The server could not be reached. Try again when the network is back.");
  const answer = await signIn("credentials", { ...credentials, redirect: false });
  if (answer?.ok && !answer.error) return { ok: true };
  return answerOf(answer?.error ?? "");
}
