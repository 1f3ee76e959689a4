import { AuditEvent, Session } from "@/db/models";

/** Ends a session for good: its cookie, wherever it is kept, opens nothing any more. */
export async function endSession(sessionId: unknown): Promise<void> {
  if (typeof sessionId !== "string") return;
  const session = await Session.findByPk(sessionId);
  if (!session || session.endedAt !== null) return;
  await session.update({ endedAt: new Date() });
  await AuditEvent.create({ actorId: session.userId, action: "sign-out" });
}
