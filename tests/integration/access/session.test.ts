import { describe, expect, it } from "vitest";
import { AuditEvent, Session, UnitMembership } from "@/db/models";
import { endSession } from "@/lib/access/end-session";
import { actorOf, IDLE_MS, SESSION_MS } from "@/lib/access/session";
import { buildMember, buildUnit, buildUser } from "../factories";
import { buildSession, cookieOf, signedInAs } from "../http/signed-in";

const now = new Date("2026-12-01T12:00:00Z");
const before = (ms: number) => new Date(now.getTime() - ms);
const read = { now, acts: false };

async function sessionAgedBy({ begun, acted }: { begun: number; acted: number }) {
  const user = await buildUser();
  return buildSession(user, { createdAt: before(begun), lastActionAt: before(acted) });
}

describe("who is asking", () => {
  it("is read from the session's row: person, roles and lead", async () => {
    const unit = await buildUnit();
    const nurse = await buildMember(unit.id, "nurse", { lead: true, name: "Ada Example" });
    const actor = await actorOf(await signedInAs(nurse), { now: new Date(), acts: false });
    expect(actor).toMatchObject({
      userId: nurse.id,
      name: "Ada Example",
      memberships: [{ unitId: unit.id, role: "nurse", lead: true }],
      administersHospitalIds: [],
    });
  });

  it("is nobody without a cookie", async () => {
    await expect(actorOf(null, read)).rejects.toMatchObject({ kind: "not-signed-in" });
  });

  it("is nobody with a cookie that was tampered with", async () => {
    const cookie = await cookieOf(await sessionAgedBy({ begun: 0, acted: 0 }));
    await expect(actorOf(`${cookie.slice(0, -3)}abc`, read)).rejects.toMatchObject({ kind: "not-signed-in" });
  });

  it("is nobody with a cookie whose session was never begun", async () => {
    const session = Session.build({ userId: (await buildUser()).id, sessionVersion: 1 });
    await expect(actorOf(await cookieOf(session), read)).rejects.toMatchObject({ kind: "not-signed-in" });
  });

  it("sees a role taken away at the next request", async () => {
    const unit = await buildUnit();
    const user = await buildMember(unit.id, "therapist");
    const cookie = await signedInAs(user);
    await UnitMembership.update({ role: "nurse" }, { where: { userId: user.id } });
    const actor = await actorOf(cookie, { now: new Date(), acts: false });
    expect(actor.memberships).toEqual([{ unitId: unit.id, role: "nurse", lead: false }]);
  });
});

describe("how long a session lasts", () => {
  it("ends 12 hours after it began, however busy it was", async () => {
    const young = await cookieOf(await sessionAgedBy({ begun: SESSION_MS - 1000, acted: 0 }));
    const old = await cookieOf(await sessionAgedBy({ begun: SESSION_MS, acted: 0 }));
    await expect(actorOf(young, read)).resolves.toBeDefined();
    await expect(actorOf(old, read)).rejects.toMatchObject({ kind: "not-signed-in", status: 401 });
    expect(SESSION_MS).toBe(12 * 60 * 60 * 1000);
  });

  it("locks after 15 minutes without a human action", async () => {
    const awake = await cookieOf(await sessionAgedBy({ begun: IDLE_MS * 2, acted: IDLE_MS - 1000 }));
    const idle = await cookieOf(await sessionAgedBy({ begun: IDLE_MS * 2, acted: IDLE_MS }));
    await expect(actorOf(awake, read)).resolves.toBeDefined();
    await expect(actorOf(idle, read)).rejects.toMatchObject({ kind: "locked", status: 401 });
    expect(IDLE_MS).toBe(15 * 60 * 1000);
  });

  it("is not renewed by reading", async () => {
    const session = await sessionAgedBy({ begun: IDLE_MS, acted: 60_000 });
    await actorOf(await cookieOf(session), read);
    await session.reload();
    expect(session.lastActionAt).toEqual(before(60_000));
  });

  it("is renewed by a call that changes something", async () => {
    const session = await sessionAgedBy({ begun: IDLE_MS, acted: 60_000 });
    await actorOf(await cookieOf(session), { now, acts: true });
    await session.reload();
    expect(session.lastActionAt).toEqual(now);
  });

  it("is not renewed by an action that comes after it locked", async () => {
    const session = await sessionAgedBy({ begun: IDLE_MS * 2, acted: IDLE_MS });
    await expect(actorOf(await cookieOf(session), { now, acts: true })).rejects.toMatchObject({ kind: "locked" });
    await session.reload();
    expect(session.lastActionAt).toEqual(before(IDLE_MS));
  });

  it("ends at sign-out, wherever its cookie is kept", async () => {
    const session = await buildSession(await buildUser());
    const cookie = await cookieOf(session);
    await endSession(session.id);
    await expect(actorOf(cookie, { now: new Date(), acts: false })).rejects.toMatchObject({ kind: "not-signed-in" });
    expect(await AuditEvent.count({ where: { actorId: session.userId, action: "sign-out" } })).toBe(1);
  });

  it("ends when the person's session version is raised, all of them at once", async () => {
    const user = await buildUser();
    const [one, other] = [await signedInAs(user), await signedInAs(user)];
    await user.update({ sessionVersion: user.sessionVersion + 1 });
    for (const cookie of [one, other]) {
      await expect(actorOf(cookie, { now: new Date(), acts: false })).rejects.toMatchObject({ kind: "not-signed-in" });
    }
    await expect(actorOf(await signedInAs(user), { now: new Date(), acts: false })).resolves.toBeDefined();
  });
});
