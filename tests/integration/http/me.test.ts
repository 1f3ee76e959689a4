import { beforeAll, describe, expect, it } from "vitest";
import { BedStay, VentilationEpisode } from "@/db/models";
import { GET as health } from "@/app/api/health/route";
import { GET as me } from "@/app/api/me/route";
import { GET as ready } from "@/app/api/ready/route";
import { POST as activity } from "@/app/api/session/activity/route";
import { POST as unlock } from "@/app/api/session/unlock/route";
import { Session } from "@/db/models";
import { hashPassword } from "@/lib/access/password";
import { meSchema } from "@/lib/contracts";
import { buildBed, buildUser } from "../factories";
import { withClient } from "../database";
import { call, paths } from "./call";
import { buildSession, cookieOf, signedInAs } from "./signed-in";
import { buildWard, type Ward } from "./ward";

let ward: Ward;

beforeAll(async () => {
  ward = await buildWard();
});

const occupy = (episode: VentilationEpisode, bedId: string) =>
  BedStay.create({ episodeId: episode.id, bedId, during: [new Date(Date.now() - 3_600_000), null] });

describe("GET /api/me", () => {
  it("tells a member's units with their role and who lies in which bed", async () => {
    const [taken, free] = [await buildBed({ unitId: ward.unit.id }), await buildBed({ unitId: ward.unit.id })];
    await occupy(ward.episode, taken.id);
    const foreignBed = await buildBed({ unitId: ward.foreign.id });
    await occupy(ward.foreignEpisode, foreignBed.id);

    const { json } = await call(me, { cookie: await signedInAs(ward.people.nurse) });
    expect(meSchema.parse(json)).toMatchObject({ administrator: false, user: { id: ward.people.nurse.id } });
    expect(json.units).toEqual([
      {
        id: ward.unit.id,
        name: ward.unit.name,
        timeZone: "Europe/London",
        gasUnit: "mmHg",
        role: "nurse",
        lead: false,
        beds: [
          { id: taken.id, label: taken.label, patientId: ward.episode.patientId },
          { id: free.id, label: free.label, patientId: null },
        ],
      },
    ]);
  });

  it("tells an administrator every unit of the hospital with its beds, and no patient", async () => {
    const { json } = await call(me, { cookie: await signedInAs(ward.people.administrator) });
    const { administrator, units } = meSchema.parse(json);
    expect(administrator).toBe(true);
    expect(units.map(({ id }) => id).sort()).toEqual([ward.unit.id, ward.foreign.id].sort());
    expect(units.flatMap(({ beds }) => beds)).not.toHaveLength(0);
    expect(units.flatMap(({ beds }) => beds.map(({ patientId }) => patientId)).every((id) => id === null)).toBe(true);
    expect(units.every(({ role, lead }) => role === null && !lead)).toBe(true);
  });

  it("tells a person of no unit who they are", async () => {
    const { status, json } = await call(me, { cookie: await signedInAs(await buildUser()) });
    expect(status).toBe(200);
    expect(json).toMatchObject({ administrator: false, units: [] });
  });

  it("tells when the session ends: twelve hours after it began", async () => {
    const session = await buildSession(ward.people.nurse);
    const { json } = await call(me, { cookie: await cookieOf(session) });
    expect(json.session).toEqual({
      endsAt: new Date(session.createdAt.getTime() + 12 * 3_600_000).toISOString(),
      lastActionAt: session.lastActionAt.toISOString(),
    });
  });
});

describe("POST /api/session/activity", () => {
  it("keeps the session awake", async () => {
    const session = await buildSession(ward.people.nurse, { lastActionAt: new Date(Date.now() - 600_000) });
    const { status, json } = await call(activity, { cookie: await cookieOf(session), body: {} });
    await session.reload();
    expect(status).toBe(200);
    expect(json.lastActionAt).toBe(session.lastActionAt.toISOString());
    expect(Date.now() - session.lastActionAt.getTime()).toBeLessThan(10_000);
  });

  it("wakes no session that has locked", async () => {
    const session = await buildSession(ward.people.nurse, { lastActionAt: new Date(Date.now() - 900_000) });
    const { status, json } = await call(activity, { cookie: await cookieOf(session), body: {} });
    expect([status, json.type]).toEqual([401, "/problems/locked"]);
  });
});

describe("POST /api/session/unlock", () => {
  const password = "low-water-at-nine";

  async function lockedSession(): Promise<{ session: Session; cookie: string }> {
    const user = await buildUser({ passwordHash: await hashPassword(password) });
    const session = await buildSession(user, { lastActionAt: new Date(Date.now() - 3_600_000) });
    return { session, cookie: await cookieOf(session) };
  }

  it("opens a locked session with its own person's password", async () => {
    const { session, cookie } = await lockedSession();
    expect((await call(me, { cookie })).json.type).toBe("/problems/locked");
    expect((await call(unlock, { cookie, body: { password } })).status).toBe(200);
    expect((await call(me, { cookie })).status).toBe(200);
    expect((await session.reload()).createdAt).toEqual(session.createdAt);
  });

  it("stays locked with a wrong one, and slows down like sign-in", async () => {
    const { cookie } = await lockedSession();
    const headers = { "x-forwarded-for": "192.0.2.77" };
    const attempt = () => call(unlock, { cookie, headers, body: { password: "wrong" } });
    const answers = [await attempt(), await attempt(), await attempt(), await attempt()];
    expect(answers.map(({ status }) => status)).toEqual([422, 422, 422, 429]);
    expect(answers[0] && paths(answers[0])).toEqual(["password"]);
    expect(answers[3]?.headers.get("retry-after")).toBe("1");
    expect((await call(me, { cookie })).status).toBe(401);
  });

  it("opens none that has ended", async () => {
    const { session, cookie } = await lockedSession();
    await session.update({ endedAt: new Date() });
    const { status, json } = await call(unlock, { cookie, body: { password } });
    expect([status, json.type]).toEqual([401, "/problems/not-signed-in"]);
  });

  it("is for calls of our own pages, in JSON, with a password", async () => {
    const { cookie } = await lockedSession();
    expect((await call(unlock, { cookie, body: { password }, headers: { origin: null } })).status).toBe(403);
    expect((await call(unlock, { cookie, body: "x", headers: { "content-type": "text/plain" } })).status).toBe(415);
    expect((await call(unlock, { cookie, body: {} })).status).toBe(422);
  });
});

describe("health and readiness", () => {
  const owner = () => process.env.TEST_DATABASE_OWNER_URL ?? "";

  it("need nobody signed in", async () => {
    expect((await call(health)).json).toEqual({ status: "ok" });
    expect((await call(ready)).json).toEqual({ status: "ready" });
  });

  it("readiness is 503 when the application could rewrite the record, and says no more than that", async () => {
    const role = decodeURIComponent(new URL(process.env.DATABASE_URL ?? "").username);
    await withClient(owner(), (client) => client.query(`GRANT UPDATE ON chart_entries TO "${role}"`));
    const answer = await call(ready);
    await withClient(owner(), (client) => client.query(`REVOKE UPDATE ON chart_entries FROM "${role}"`));
    expect(answer.status).toBe(503);
    expect(JSON.stringify(answer.json)).not.toContain("chart_entries");
    expect((await call(ready)).status).toBe(200);
  });
});
