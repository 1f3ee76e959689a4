import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { z } from "zod";
import { AuditEvent, Session, Submission } from "@/db/models";
import { AppError, clientKeySchema, patientParamsSchema } from "@/lib/contracts";
import { MAX_BODY_BYTES } from "@/lib/http/json-body";
import { route } from "@/lib/http/route";
import { call, paths, type Sent } from "./call";
import { signedInAs } from "./signed-in";
import { buildWard, type Ward } from "./ward";

let ward: Ward;
let cookie: string;

beforeAll(async () => {
  ward = await buildWard();
  cookie = await signedInAs(ward.people.therapist);
});

const bodySchema = z.strictObject({
  clientKey: clientKeySchema,
  fio2: z.number().max(1, "FiO2 is at most 1."),
  note: z.string().min(3, "Say more.").optional(),
  refuse: z.boolean().optional(),
});

/** A use case as small as can be: it leaves one row that its repeat finds again. */
const chartNote = route({
  access: "settings:chart",
  params: patientParamsSchema,
  body: bodySchema,
  status: 201,
  response: z.object({ submissionId: z.string(), rows: z.number(), again: z.boolean() }),
  run: async ({ transaction, submissionId, actor }, { body }) => {
    await AuditEvent.create({ action: "test", actorId: actor.userId, submissionId }, { transaction });
    if (body.refuse) throw new AppError("conflict", "Refused after it wrote.");
    return { submissionId: submissionId ?? "", rows: 1, again: false };
  },
  repeat: async ({ transaction }, { submissionId }) => ({
    submissionId,
    rows: await AuditEvent.count({ where: { submissionId }, transaction }),
    again: true,
  }),
});

const post = (sent: Sent = {}) =>
  call(chartNote, {
    cookie,
    path: `/api/patients/${ward.episode.patientId}/settings`,
    params: { patientId: ward.episode.patientId },
    body: { clientKey: randomUUID(), fio2: 0.4 },
    ...sent,
  });

const submissionsOf = (clientKey: string) => Submission.count({ where: { clientKey } });

describe("where a call comes from", () => {
  it("is refused with 403 without an Origin, with another host's, and with one that is no address", async () => {
    for (const origin of [null, "http://ward.example", "http://127.0.0.1:3001", "null"]) {
      const answer = await post({ headers: { origin } });
      expect(answer.status, String(origin)).toBe(403);
    }
  });

  it("is asked before who it comes from", async () => {
    expect((await post({ cookie: "", headers: { origin: "http://ward.example" } })).status).toBe(403);
  });

  it("must be JSON, else 415", async () => {
    for (const type of ["text/plain", "application/x-www-form-urlencoded", null]) {
      expect((await post({ headers: { "content-type": type } })).status, String(type)).toBe(415);
    }
    expect((await post({ headers: { "content-type": "application/json; charset=utf-8" } })).status).toBe(201);
  });
});

describe("the order of refusals", () => {
  it("is session, then patient and right, then the body", async () => {
    const malformed = "{";
    const foreign = { patientId: ward.foreignEpisode.patientId };
    expect((await post({ cookie: "", params: foreign, body: malformed })).status).toBe(401);
    expect((await post({ params: foreign, body: malformed })).status).toBe(404);
    expect((await post({ body: malformed })).status).toBe(400);
  });

  it("puts the fields a role may not send before a known key and before the schema", async () => {
    const nurse = await signedInAs(ward.people.nurse);
    const answer = await post({ cookie: nurse, body: { clientKey: "no key", fio2: 7, peepCmH2O: 10, mode: "A/C-VC" } });
    expect(answer.status).toBe(403);
    expect(paths(answer)).toEqual(["peepCmH2O", "mode"]);
  });

  it("puts a known key before the schema", async () => {
    const clientKey = randomUUID();
    await post({ body: { clientKey, fio2: 0.4 } });
    expect((await post({ body: { clientKey, fio2: 7 } })).status).toBe(409);
  });
});

describe("a patient who is not there", () => {
  it("answers like one of another unit: missing, malformed and beyond what PostgreSQL counts to", async () => {
    const answers = await Promise.all(
      [ward.foreignEpisode.patientId, "999999", "9999999999999999999", "abc", "1e3"].map((patientId) =>
        post({ params: { patientId } }),
      ),
    );
    for (const { status, json } of answers) {
      expect(status).toBe(404);
      expect(json).toEqual(answers[0]?.json);
    }
  });
});

describe("a body", () => {
  it("over 256 kB is 413, whether or not it says so", async () => {
    const body = JSON.stringify({ clientKey: randomUUID(), fio2: 0.4, note: "x".repeat(MAX_BODY_BYTES) });
    expect((await post({ body })).status).toBe(413);
    expect((await post({ body, headers: { "content-length": "10" } })).status).toBe(413);
    expect((await post({ headers: { "content-length": String(MAX_BODY_BYTES + 1) } })).status).toBe(413);
  });

  it("that is no JSON is 400, and so is none at all", async () => {
    for (const body of ["{", "", "{'fio2': 0.4}"]) expect((await post({ body })).status, body).toBe(400);
  });

  it("is refused with every issue at once, each at its own path", async () => {
    const answer = await post({ body: { clientKey: "x", fio2: 7, note: "", mood: 1, refuse: "no" } });
    expect(answer.status).toBe(422);
    expect(paths(answer).sort()).toEqual(["clientKey", "fio2", "mood", "note", "refuse"]);
    expect(answer.headers.get("content-type")).toBe("application/problem+json");
    expect(answer.json).toMatchObject({ type: "/problems/validation-failed", status: 422 });
  });

  it("that is JSON but no object is refused by the schema", async () => {
    for (const body of ["null", "[]", "7", '"text"']) expect((await post({ body })).status, body).toBe(422);
  });
});

describe("the same key twice", () => {
  it("is one entry: 201, then 200 with the same submission, whatever the order of the fields", async () => {
    const clientKey = randomUUID();
    const first = await post({ body: `{"clientKey":"${clientKey}","fio2":0.4,"note":"turned"}` });
    const second = await post({ body: `{"note":"turned","fio2":0.4,"clientKey":"${clientKey}"}` });
    expect([first.status, second.status]).toEqual([201, 200]);
    expect(second.json).toEqual({ submissionId: first.json.submissionId, rows: 1, again: true });
    expect(await submissionsOf(clientKey)).toBe(1);
  });

  it("is one entry when six come at once: one 201 and five 200", async () => {
    const body = { clientKey: randomUUID(), fio2: 0.45 };
    const answers = await Promise.all(Array.from({ length: 6 }, () => post({ body })));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 200, 200, 201]);
    expect(new Set(answers.map(({ json }) => json.submissionId)).size).toBe(1);
    expect(await submissionsOf(body.clientKey)).toBe(1);
  });

  it("is 409 with another body", async () => {
    const clientKey = randomUUID();
    await post({ body: { clientKey, fio2: 0.4 } });
    expect((await post({ body: { clientKey, fio2: 0.5 } })).status).toBe(409);
    expect((await post({ body: { clientKey, fio2: 0.4, note: "more" } })).status).toBe(409);
  });

  it("is 409 at another address with the same body", async () => {
    const body = { clientKey: randomUUID(), fio2: 0.4 };
    await post({ body });
    expect((await post({ body, path: `/api/patients/${ward.episode.patientId}/mechanics` })).status).toBe(409);
  });

  it("from two people is two entries", async () => {
    const body = { clientKey: randomUUID(), fio2: 0.4 };
    const intensivist = await signedInAs(ward.people.intensivist);
    expect((await post({ body })).status).toBe(201);
    expect((await post({ body, cookie: intensivist })).status).toBe(201);
  });

  it("is free again after a refusal, with any body, and leaves no row behind", async () => {
    const clientKey = randomUUID();
    expect((await post({ body: { clientKey, fio2: 7 } })).status).toBe(422);
    expect((await post({ body: { clientKey, fio2: 0.4, refuse: true } })).status).toBe(409);
    expect(await submissionsOf(clientKey)).toBe(0);
    const answer = await post({ body: { clientKey, fio2: 0.4 } });
    expect([answer.status, answer.json.rows]).toEqual([201, 1]);
    expect(await AuditEvent.count({ where: { submissionId: String(answer.json.submissionId) } })).toBe(1);
  });
});

describe("an answer", () => {
  it("is never kept by a cache and names its request", async () => {
    const answers = [await post(), await post({ cookie: "" })];
    for (const { headers } of answers) {
      expect(headers.get("cache-control")).toBe("no-store");
      expect(headers.get("x-request-id")).toMatch(/^[0-9a-f-]{36}$/);
    }
  });

  it("carries only what its contract names", async () => {
    const leaking = route({
      access: "session:own",
      response: z.object({ name: z.string() }),
      run: async ({ actor }) => ({ name: actor.name, email: actor.email }),
    });
    expect((await call(leaking, { cookie })).json).toEqual({ name: ward.people.therapist.name });
  });

  it("that breaks its contract is 500, and what was written with it is rolled back", async () => {
    const clientKey = randomUUID();
    const broken = route({
      access: "session:own",
      body: z.strictObject({ clientKey: clientKeySchema }),
      response: z.object({ rows: z.number().max(0) }),
      run: async () => ({ rows: 1 }),
      repeat: async () => ({ rows: 0 }),
    });
    expect((await call(broken, { cookie, body: { clientKey } })).status).toBe(500);
    expect(await submissionsOf(clientKey)).toBe(0);
  });

  it("to an error nobody expected says nothing of it", async () => {
    const failing = route({
      access: "session:own",
      response: z.object({}),
      run: async () => {
        throw new Error("relation patients: Doe, Jane");
      },
    });
    const answer = await call(failing, { cookie });
    expect(answer.status).toBe(500);
    expect(JSON.stringify(answer.json)).not.toContain("Doe");
    expect(answer.json.type).toBe("/problems/internal");
  });
});

describe("a session", () => {
  it("is renewed by a call that changes something even when that is refused, and never by a read", async () => {
    const session = await Session.findOne({
      where: { userId: ward.people.therapist.id },
      order: [["createdAt", "DESC"]],
      rejectOnEmpty: true,
    });
    const earlier = new Date(Date.now() - 60_000);
    await session.update({ lastActionAt: earlier });
    const read = route({ access: "session:own", response: z.object({}), run: async () => ({}) });
    await call(read, { cookie });
    expect((await session.reload()).lastActionAt).toEqual(earlier);
    await post({ body: "{" });
    expect((await session.reload()).lastActionAt.getTime()).toBeGreaterThan(earlier.getTime());
  });
});
