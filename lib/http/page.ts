import { randomUUID } from "node:crypto";
import { headers } from "next/headers";
import { forbidden, notFound, redirect } from "next/navigation";
import { cache } from "react";
import type { Actor, Ctx } from "@/lib/access/context";
import { grant } from "@/lib/access/grant";
import type { GrantOf } from "@/lib/access/granted";
import type { Right } from "@/lib/access/rights";
import { actorOf, signedIn, type SignedIn } from "@/lib/access/session";
import { AppError } from "@/lib/contracts";
import { PATH_HEADER } from "./path-header";
import { inTransaction } from "./transaction";

interface Asked {
  actor: Actor;
  now: Date;
}

/** Layout and page of one request ask the same person, at the same moment, once. */
const asked = cache(async (): Promise<Asked> => {
  const now = new Date();
  const actor = await actorOf((await headers()).get("cookie"), { now, acts: false });
  return { actor, now };
});

/** Where a refused page sends the reader; what is no refusal stays an error. */
async function leave(error: unknown): Promise<never> {
  if (!(error instanceof AppError)) throw error;
  const next = encodeURIComponent((await headers()).get(PATH_HEADER) ?? "/");
  switch (error.kind) {
    case "not-signed-in":
      return redirect(`/sign-in?next=${next}`);
    case "locked":
      return redirect(`/locked?next=${next}`);
    case "forbidden":
      return forbidden();
    case "not-found":
      return notFound();
    default:
      throw error;
  }
}

interface PageSpec<Held extends Right, Read> {
  /** The right the page takes; its row is named by the path, as in a route. */
  access: Held;
  params?: unknown;
  read: (ctx: Ctx, granted: GrantOf<Held>) => Promise<Read>;
}

async function readAs<Held extends Right, Read>({ access, params, read }: PageSpec<Held, Read>): Promise<Read> {
  const asker = await asked();
  const granted = await grant(access, asker, { params, json: async () => undefined });
  if (granted === null) throw new Error("A page names its row in its path.");
  return inTransaction((transaction) =>
    read({ ...asker, transaction, requestId: randomUUID(), submissionId: null }, granted),
  );
}

/**
 * What a page shows, read as the person who asks: the same session, right, row and transaction as a route's. Without
 * a session it leads to sign-in and back, locked to the lock screen; without the right it is forbidden or not found.
 *
 * @example
 * const worksheet = await pageRead({
 *   access: "patients:read",
 *   params: await params,
 *   read: (ctx, granted) => readWorksheet(ctx, granted, {}),
 * });
 */
export async function pageRead<Held extends Right, Read>(spec: PageSpec<Held, Read>): Promise<Read> {
  return readAs(spec).catch(leave);
}

/** Who is signed in on this request, locked or not; null for nobody. For the pages that need no right. */
export async function whoIsHere(): Promise<SignedIn | null> {
  return signedIn((await headers()).get("cookie"), new Date());
}
