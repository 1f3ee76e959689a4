import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { watchSession } from "@/lib/client/session-watch";
import { onSessionLoss } from "@/lib/client/session-loss";

const start = Date.parse("2026-12-01T08:00:00Z");
const minutes = (count: number) => count * 60_000;
const at = (ms: number) => new Date(start + ms).toISOString();

/** What the server would answer, by address; null is a lost network. */
let answers: Record<string, { status: number; json: unknown } | null>;
let asked: string[];

const me = (lastActionAt: string) => ({
  status: 200,
  json: {
    user: { id: "1", name: "Ada Example", email: "ada@example.test" },
    administrator: false,
    session: { endsAt: at(minutes(720)), lastActionAt },
    units: [],
  },
});

const problem = (kind: string) => ({
  status: 401,
  json: { type: `/problems/${kind}`, title: "", status: 401, detail: "Locked.", errors: [] },
});

beforeEach(() => {
  asked = [];
  answers = { "/api/session/activity": { status: 200, json: { lastActionAt: at(0) } }, "/api/me": me(at(0)) };
  vi.useFakeTimers({ toFake: ["Date"], now: start });
  vi.stubGlobal("fetch", async (path: string) => {
    asked.push(path);
    const answer = answers[path];
    if (!answer) throw new TypeError("network lost");
    return Response.json(answer.json, { status: answer.status });
  });
});

afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

const watch = () => watchSession({ endsAt: at(minutes(720)), lastActionAt: at(0) });
const passTo = (ms: number) => vi.setSystemTime(start + ms);

describe("the session of an open page", () => {
  it("tells the server of keys and touches, once a minute at most", async () => {
    const session = watch();
    session.act();
    expect(asked).toEqual([]);
    passTo(minutes(1));
    for (let key = 0; key < 5; key += 1) session.act();
    passTo(minutes(2) - 1);
    session.act();
    expect(asked).toEqual(["/api/session/activity"]);
    passTo(minutes(2));
    session.act();
    await vi.waitFor(() => expect(asked).toHaveLength(2));
  });

  it("tells again at the next key when the network was lost", async () => {
    const session = watch();
    answers["/api/session/activity"] = null;
    passTo(minutes(1));
    session.act();
    await vi.waitFor(() => {
      session.act();
      expect(asked.length).toBeGreaterThan(1);
    });
  });

  it("asks nothing before 15 minutes have passed", async () => {
    const session = watch();
    passTo(minutes(15) - 1);
    await session.check();
    expect(asked).toEqual([]);
    expect(session.state().loss).toBeNull();
  });

  it("locks when the server says so", async () => {
    const session = watch();
    const stop = onSessionLoss(session.lose);
    answers["/api/me"] = problem("locked");
    passTo(minutes(15));
    await session.check();
    expect(session.state().loss).toBe("locked");
    stop();
  });

  it("stays open when another tab was used meanwhile", async () => {
    const session = watch();
    answers["/api/me"] = me(at(minutes(10)));
    passTo(minutes(15));
    await session.check();
    expect(session.state().loss).toBeNull();
    asked = [];
    passTo(minutes(25) - 1);
    await session.check();
    expect(asked).toEqual([]);
  });

  it("waits with the lock while there is no network, for an hour at most", async () => {
    const session = watch();
    answers["/api/me"] = null;
    passTo(minutes(60) - 1);
    await session.check();
    expect(session.state().loss).toBeNull();
    passTo(minutes(60));
    await session.check();
    expect(session.state().loss).toBe("locked");
  });

  it("warns in the last 15 of its 12 hours, minute by minute, and ends with them", async () => {
    const session = watch();
    answers["/api/me"] = me(at(minutes(705)));
    passTo(minutes(704));
    await session.check();
    expect(session.state().endsInMinutes).toBeNull();
    passTo(minutes(705));
    await session.check();
    expect(session.state().endsInMinutes).toBe(15);
    passTo(minutes(719) + 1);
    await session.check();
    expect(session.state().endsInMinutes).toBe(1);
    passTo(minutes(720));
    await session.check();
    expect(session.state().loss).toBe("not-signed-in");
  });

  it("tells the server nothing while locked, and is as new once opened", () => {
    const session = watch();
    const heard = vi.fn();
    session.subscribe(heard);
    session.lose("locked");
    passTo(minutes(20));
    session.act();
    expect(asked).toEqual([]);
    session.opened({ endsAt: at(minutes(720)), lastActionAt: at(minutes(20)) });
    expect(session.state()).toEqual({ loss: null, endsInMinutes: null });
    expect(heard).toHaveBeenCalledTimes(2);
  });
});
