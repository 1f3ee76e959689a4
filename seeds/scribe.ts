import { createHash, randomUUID } from "node:crypto";
import { sequelize } from "@/db/connection";
import { Submission } from "@/db/models";
import type { Actor, Ctx } from "@/lib/access/context";
import { grant } from "@/lib/access/grant";
import type { GrantOf } from "@/lib/access/granted";
import type { Right } from "@/lib/access/rights";

interface Act<Held extends Right> {
  actor: Actor;
  now: Date;
  right: Held;
  /** The row: a patient's id in the path, or an admission's unit in the body. */
  patientId?: string;
  body: { clientKey: string };
}

const hashOf = (body: unknown) => createHash("sha256").update(JSON.stringify(body)).digest("hex");

/** A use case as that person would have called it at that moment: with their rights, a submission and one transaction. */
export async function actAs<Held extends Right, Result>(
  { actor, now, right, patientId, body }: Act<Held>,
  run: (ctx: Ctx, granted: GrantOf<Held>) => Promise<Result>,
): Promise<Result> {
  const granted = await grant(right, { actor, now }, { params: { patientId }, json: async () => body });
  if (!granted) throw new Error(`${actor.name} was granted no row for ${right}`);
  return sequelize.transaction(async (transaction) => {
    const submission = await Submission.create(
      { authorId: actor.userId, clientKey: body.clientKey, bodyHash: hashOf(body), recordedAt: now },
      { transaction },
    );
    return run({ actor, now, transaction, requestId: "seed", submissionId: submission.id }, granted);
  });
}

export const newKey = (): string => randomUUID();
