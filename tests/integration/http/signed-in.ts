import { encode } from "next-auth/jwt";
import type { CreationAttributes } from "sequelize";
import { Session, User } from "@/db/models";
import { sessionCookieName } from "@/lib/access/session-cookie";
import { env } from "@/lib/env";

/** The cookie that next-auth would set for this session. */
export async function cookieOf(session: Session): Promise<string> {
  const token = await encode({ token: { sessionId: session.id }, secret: env().NEXTAUTH_SECRET });
  return `${sessionCookieName()}=${token}`;
}

export function buildSession(user: User, overrides: Partial<CreationAttributes<Session>> = {}): Promise<Session> {
  const now = new Date();
  return Session.create({
    userId: user.id,
    sessionVersion: user.sessionVersion,
    createdAt: now,
    lastActionAt: now,
    ...overrides,
  });
}

/** Signs a person in: a session of their own, and its cookie. */
export async function signedInAs(user: User): Promise<string> {
  await user.reload();
  return cookieOf(await buildSession(user));
}
