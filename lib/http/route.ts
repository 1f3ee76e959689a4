import type { z } from "zod";
import type { Ctx } from "@/lib/access/context";
import type { GrantOf } from "@/lib/access/granted";
import type { Right } from "@/lib/access/rights";
import { admit } from "./admit";
import { checked } from "./checked";
import { claimKey } from "./claim";
import { refuseFields } from "./refuse-fields";
import { respond, type Answer } from "./respond";
import { inTransaction } from "./transaction";

interface Given<Held extends Right, Params> {
  granted: GrantOf<Held>;
  params: Params;
}

export interface Declared<
  Held extends Right,
  Reply extends z.ZodType,
  Params extends z.ZodType,
  Query extends z.ZodType,
  Body extends z.ZodType,
> {
  /** The right it takes. Where it holds (which patient, which unit) comes from the row that the path names. */
  access: Held;
  params?: Params;
  query?: Query;
  body?: Body;
  /** Of a first success: 200 unless said; a repeat is always 200. */
  status?: number;
  response: Reply;
  /** A further look at the JSON as sent, before key and schema: fields a role may send only of some rows (403). */
  guard?: (ctx: Ctx, given: Given<Held, z.output<Params>> & { json: unknown }) => Promise<void>;
  run: (
    ctx: Ctx,
    given: Given<Held, z.output<Params>> & { query: z.output<Query>; body: z.output<Body> },
  ) => Promise<z.input<Reply>>;
}

/** A body with a `clientKey` must also say how its repeat is answered: from what the first sending left. */
type Repeatable<Held extends Right, Reply, Params, Body> = Body extends { clientKey: string }
  ? { repeat: (ctx: Ctx, given: Given<Held, Params> & { submissionId: string }) => Promise<Reply> }
  : { repeat?: undefined };

/**
 * One handler, declared. The order is the contract's: origin and media type, session, right and row, JSON; then in one
 * transaction the fields a role may send, the known key, the schema, the use case and the answer's contract.
 * Whatever refuses rolls all of it back, and the key stays free.
 *
 * @example
 * export const POST = route({
 *   access: "settings:chart",
 *   params: patientParamsSchema,
 *   body: settingsBodySchema,
 *   status: 201,
 *   response: chartAnswerSchema,
 *   run: (ctx, { granted, body }) => chartSettings(ctx, granted, body),
 *   repeat: (ctx, { granted, submissionId }) => chartAnswerOf(ctx, granted, submissionId),
 * });
 */
export function route<
  Held extends Right,
  Reply extends z.ZodType,
  Params extends z.ZodType = z.ZodUndefined,
  Query extends z.ZodType = z.ZodUndefined,
  Body extends z.ZodType = z.ZodUndefined,
>(
  spec: Declared<Held, Reply, Params, Query, Body> & Repeatable<Held, z.input<Reply>, z.output<Params>, z.output<Body>>,
) {
  async function handle(request: Request, path: unknown, requestId: string): Promise<Answer> {
    const { actor, now, granted, params, json, hash } = await admit(spec, request, path);
    return inTransaction(async (transaction) => {
      const ctx: Ctx = { actor, now, transaction, requestId, submissionId: null };
      refuseFields(spec.access, granted, json);
      await spec.guard?.(ctx, { granted, params, json });
      const claim = spec.repeat ? await claimKey(ctx, json, hash) : null;
      if (claim?.repeat && spec.repeat) {
        const left = await spec.repeat(ctx, { granted, params, submissionId: claim.submissionId });
        return { status: 200, body: spec.response.parse(left) };
      }
      const query = (spec.query && checked(spec.query, searchOf(request))) as z.output<Query>;
      const body = (spec.body && checked(spec.body, json)) as z.output<Body>;
      const answer = await spec.run(
        { ...ctx, submissionId: claim?.submissionId ?? null },
        { granted, params, query, body },
      );
      return { status: spec.status ?? 200, body: spec.response.parse(answer) };
    });
  }
  return (request: Request, context: { params: Promise<unknown> }) =>
    respond(request, async (requestId) => handle(request, await context.params, requestId));
}

function searchOf(request: Request): Record<string, string> {
  return Object.fromEntries(new URL(request.url).searchParams);
}
