import type { z } from "zod";
import type { Actor } from "@/lib/access/context";
import { grant } from "@/lib/access/grant";
import type { GrantOf } from "@/lib/access/granted";
import type { Right } from "@/lib/access/rights";
import { actorOf } from "@/lib/access/session";
import { bodyHash } from "./body-hash";
import { checked, checkedParams } from "./checked";
import { readJson, refuseOtherMedia } from "./json-body";
import { changesState, refuseForeignOrigin } from "./same-origin";

interface Door<Held extends Right, Params extends z.ZodType> {
  access: Held;
  params?: Params;
  body?: z.ZodType;
}

export interface Admitted<Held extends Right, Params> {
  actor: Actor;
  now: Date;
  granted: GrantOf<Held>;
  params: Params;
  json: unknown;
  hash: string;
}

/**
 * Everything that is asked before a transaction begins, in the contract's order: origin and media type, session,
 * right and row, JSON. Only an admission, whose unit stands in the body, reads the body before its row is granted.
 */
export async function admit<Held extends Right, Params extends z.ZodType>(
  { access, params: paramsSchema, body }: Door<Held, Params>,
  request: Request,
  path: unknown,
): Promise<Admitted<Held, z.output<Params>>> {
  const writes = changesState(request);
  if (writes) {
    refuseForeignOrigin(request);
    refuseOtherMedia(request);
  }
  const now = new Date();
  const actor = await actorOf(request.headers.get("cookie"), { now, acts: writes });
  const params = (paramsSchema && checkedParams(paramsSchema, path)) as z.output<Params>;
  const sent = body ? once(() => readJson(request)) : async () => undefined;
  const granted = await grant(access, { actor, now }, { params, json: sent });
  const json = await sent();
  if (granted === null) throw unnamedRow(body, json);
  return { actor, now, granted, params, json, hash: bodyHash(request.method, new URL(request.url).pathname, json) };
}

/** Only a body that does not name its unit leaves nothing to grant; its schema says so, with all else that is wrong. */
function unnamedRow(body: z.ZodType | undefined, json: unknown): Error {
  if (body) checked(body, json);
  return new Error("A body without the id of its unit passed its schema.");
}

function once<Value>(make: () => Promise<Value>): () => Promise<Value> {
  let made: Promise<Value> | undefined;
  return () => (made ??= make());
}
