import { AuditEvent, User } from "@/db/models";
import { AppError } from "@/lib/contracts";
import { passwordMatches } from "./password";
import type { SignedIn } from "./session";
import { slowed } from "./slowing";

interface Try {
  password: string;
  address: string;
  now: Date;
}

/**
 * Opens a locked session again with its own person's password; it still ends 12 h after it began.
 * @throws AppError `slow-down`, or `validation-failed` at `password`
 */
export async function unlock({ session, actor }: SignedIn, { password, address, now }: Try): Promise<void> {
  const { passwordHash } = await User.findByPk(actor.userId, { rejectOnEmpty: true });
  const matches = await slowed({ email: actor.email, address }, async () =>
    (await passwordMatches(password, passwordHash)) ? true : null,
  );
  await AuditEvent.create({ actorId: actor.userId, action: matches ? "unlock" : "unlock refused" });
  if (!matches) throw wrongPassword();
  await session.update({ lastActionAt: now });
}

function wrongPassword(): AppError {
  const message = "That is not your password.";
  return new AppError("validation-failed", message, { errors: [{ path: "password", message }] });
}
