import { decode } from "next-auth/jwt";
import { env } from "@/lib/env";

/** As next-auth names it; `__Secure-` binds it to https. */
export function sessionCookieName(): string {
  const secure = env().NEXTAUTH_URL.startsWith("https:");
  return `${secure ? "__Secure-" : ""}next-auth.session-token`;
}

function valueOf(cookieHeader: string, name: string): string | undefined {
  const pair = cookieHeader.split(";").find((part) => part.trim().startsWith(`${name}=`));
  return pair?.trim().slice(name.length + 1);
}

const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** The session id that the signed cookie carries, or null: none, not ours, or tampered with. */
export async function sessionIdOf(cookieHeader: string | null): Promise<string | null> {
  const token = valueOf(cookieHeader ?? "", sessionCookieName());
  if (!token) return null;
  // A token that was not sealed with our secret throws: it is no session, and no error of ours.
  const payload = await decode({ token, secret: env().NEXTAUTH_SECRET }).catch(() => null);
  const id = payload?.sessionId;
  return typeof id === "string" && uuid.test(id) ? id : null;
}
