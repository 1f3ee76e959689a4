import type { Ctx } from "@/lib/access/context";
import { AppError, clientKeySchema } from "@/lib/contracts";
import { Submission } from "@/db/models";

/** A first sending has claimed its key and must be run; a repeat answers with what the first one left. */
export interface Claim {
  submissionId: string;
  repeat: boolean;
}

/**
 * Claims the body's `clientKey` for this person, or finds the submission that already holds it. One that waits here
 * for a racing twin reads the winner by its next statement (READ COMMITTED); a refusal rolls the claim back.
 *
 * A key that is not a UUID claims nothing: the schema, which comes next, refuses it beside whatever else is wrong.
 */
export async function claimKey(ctx: Ctx, json: unknown, hash: string): Promise<Claim | null> {
  const key = clientKeySchema.safeParse((json as { clientKey?: unknown } | null)?.clientKey);
  if (!key.success) return null;
  const { transaction } = ctx;
  const mine = { authorId: ctx.actor.userId, clientKey: key.data };
  const [inserted] = await Submission.bulkCreate([{ ...mine, bodyHash: hash }], {
    ignoreDuplicates: true,
    returning: true,
    transaction,
  });
  if (inserted?.id) return { submissionId: inserted.id, repeat: false };
  const first = await Submission.findOne({ where: mine, transaction, rejectOnEmpty: true });
  if (first.bodyHash === hash) return { submissionId: first.id, repeat: true };
  throw new AppError("conflict", "This key was already used for another entry. Send a new one with its own key.");
}
