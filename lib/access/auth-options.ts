import type { NextAuthOptions } from "next-auth";
import Credentials from "next-auth/providers/credentials";
import { AppError, signInSchema } from "@/lib/contracts";
import { env } from "@/lib/env";
import { addressOf } from "./address";
import { endSession } from "./end-session";
import { SESSION_MS } from "./session";
import { signIn } from "./sign-in";

/** next-auth passes on an error's message and nothing else; the sign-in page and the handler read the wait from it. */
export const slowDownPrefix = "slow-down:";

async function authorize(sent: unknown, headers: Record<string, unknown>): Promise<{ id: string } | null> {
  const credentials = signInSchema.safeParse(sent);
  if (!credentials.success) return null;
  try {
    const sessionId = await signIn(credentials.data, addressOf(headers["x-forwarded-for"]));
    return sessionId === null ? null : { id: sessionId };
  } catch (error) {
    if (!(error instanceof AppError) || error.kind !== "slow-down") throw error;
    throw new Error(`${slowDownPrefix}${error.headers["Retry-After"]}`, { cause: error });
  }
}

/**
 * next-auth keeps the cookie and its forms; the `sessions` row decides everything else. What it calls the user's id is
 * the session's, and the cookie carries nothing more: no name, no role, nothing that could be out of date.
 */
export function authOptions(): NextAuthOptions {
  return {
    secret: env().NEXTAUTH_SECRET,
    session: { strategy: "jwt", maxAge: SESSION_MS / 1000 },
    pages: { signIn: "/sign-in", error: "/sign-in" },
    providers: [
      Credentials({
        id: "credentials",
        credentials: { email: { type: "email" }, password: { type: "password" } },
        authorize: (sent, request) => authorize(sent, request.headers ?? {}),
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => ({ sessionId: user ? user.id : token.sessionId }),
      session: ({ session }) => ({ expires: session.expires }),
    },
    events: {
      signOut: ({ token }) => endSession(token.sessionId),
    },
  };
}
