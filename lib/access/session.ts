import { HospitalAdministrator, Session, UnitMembership, User } from "@/db/models";
import { AppError } from "@/lib/contracts";
import type { Actor } from "./context";
import { sessionIdOf } from "./session-cookie";

const MINUTE_MS = 60_000;

/** A session ends this long after it began, whatever its cookie says. */
export const SESSION_MS = 12 * 60 * MINUTE_MS;
/** Without a human action for this long the person must give their password again. */
export const IDLE_MS = 15 * MINUTE_MS;

export interface SignedIn {
  session: Session;
  actor: Actor;
  locked: boolean;
}

function isLocked(session: Session, now: Date): boolean {
  return now.getTime() - session.lastActionAt.getTime() >= IDLE_MS;
}

function isOver(session: Session, user: User, now: Date): boolean {
  const old = now.getTime() - session.createdAt.getTime() >= SESSION_MS;
  return old || session.endedAt !== null || session.sessionVersion !== user.sessionVersion;
}

async function personOf(session: Session): Promise<{ user: User; actor: Actor }> {
  const { userId } = session;
  const [user, memberships, administered] = await Promise.all([
    User.findByPk(userId, { rejectOnEmpty: true }),
    UnitMembership.findAll({ where: { userId }, order: ["unitId"] }),
    HospitalAdministrator.findAll({ where: { userId }, order: ["hospitalId"] }),
  ]);
  const actor: Actor = {
    userId,
    name: user.name,
    email: user.email,
    sessionId: session.id,
    memberships: memberships.map(({ unitId, role, lead }) => ({ unitId, role, lead })),
    administersHospitalIds: administered.map(({ hospitalId }) => hospitalId),
  };
  return { user, actor };
}

/** Who is signed in, locked or not; null where nobody is. */
export async function signedIn(cookieHeader: string | null, now: Date): Promise<SignedIn | null> {
  const id = await sessionIdOf(cookieHeader);
  const session = id === null ? null : await Session.findByPk(id);
  if (session === null) return null;
  const { user, actor } = await personOf(session);
  return isOver(session, user, now) ? null : { session, actor, locked: isLocked(session, now) };
}

interface Asking {
  now: Date;
  /** A state-changing call is a human action and keeps the session from locking; a read never is. */
  acts: boolean;
}

/**
 * The person who asks, read from the database at every request, so that a role taken away, a session ended or a
 * password changed counts at once.
 * @throws AppError `not-signed-in`, or `locked` after 15 minutes without action
 */
export async function actorOf(cookieHeader: string | null, { now, acts }: Asking): Promise<Actor> {
  const found = await signedIn(cookieHeader, now);
  if (found === null) throw new AppError("not-signed-in", "Sign in to go on.");
  if (found.locked) throw new AppError("locked", "Give your password to go on; what you typed is kept.");
  if (acts) await found.session.update({ lastActionAt: now });
  return found.actor;
}
