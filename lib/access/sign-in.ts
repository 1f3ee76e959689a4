import { AuditEvent, Session, User } from "@/db/models";
import { passwordMatches } from "./password";
import { slowed } from "./slowing";

interface Credentials {
  email: string;
  password: string;
}

async function userWith({ email, password }: Credentials): Promise<User | null> {
  const user = await User.findOne({ where: { email: email.trim().toLowerCase() } });
  const matches = await passwordMatches(password, user?.passwordHash ?? null);
  if (!matches) await AuditEvent.create({ actorId: null, action: "sign-in refused", ...subjectOf(user) });
  return matches ? user : null;
}

/** An address that nobody has is not written down: it may be a password typed into the wrong field. */
function subjectOf(user: User | null) {
  return user ? { subject: "users", subjectId: user.id } : {};
}

/**
 * Checks an e-mail address and password and begins a session. An address that nobody has takes as long as a wrong
 * password and answers the same.
 * @returns the session's id, or null where they do not belong together
 * @throws AppError `slow-down` after repeated failures
 */
export async function signIn(credentials: Credentials, address: string, now = new Date()): Promise<string | null> {
  const user = await slowed({ email: credentials.email, address }, () => userWith(credentials));
  if (!user) return null;
  const { id } = await Session.create({
    userId: user.id,
    sessionVersion: user.sessionVersion,
    createdAt: now,
    lastActionAt: now,
  });
  await AuditEvent.create({ actorId: user.id, action: "sign-in" });
  return id;
}
