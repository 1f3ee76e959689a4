import { randomUUID } from "node:crypto";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { AuditEvent, Session, SignInAttempt, User } from "@/db/models";
import { authOptions } from "@/lib/access/auth-options";
import { hashPassword } from "@/lib/access/password";
import { signIn } from "@/lib/access/sign-in";
import { AppError } from "@/lib/contracts";
import { buildUser } from "../factories";

const password = "low-water-at-nine";
const passwordHash = await hashPassword(password);
const address = () => `192.0.2.${Math.floor(Math.random() * 250)}-${randomUUID()}`;

const person = () => buildUser({ passwordHash });

/** What a try answers: the session's id, null for a wrong password, or the seconds to wait. */
async function attempt(email: string, from: string, typed = "wrong"): Promise<string | null> {
  try {
    return (await signIn({ email, password: typed }, from)) === null ? null : "in";
  } catch (error) {
    if (!(error instanceof AppError) || error.kind !== "slow-down") throw error;
    return `wait ${error.headers["Retry-After"]}`;
  }
}

async function failTimes(count: number, email: string, from: string): Promise<(string | null)[]> {
  const answers: (string | null)[] = [];
  for (let n = 0; n < count; n += 1) answers.push(await attempt(email, from));
  return answers;
}

/** A failure that begins a wait, then the wait. */
async function failAndWait(email: string, from: string): Promise<string | null> {
  const answer = await attempt(email, from);
  const seconds = Number(answer?.replace("wait ", "") ?? 0);
  vi.setSystemTime(Date.now() + seconds * 1000);
  return answer;
}

beforeEach(() => vi.useFakeTimers({ toFake: ["Date"], now: new Date("2026-12-01T12:00:00Z") }));
afterEach(() => vi.useRealTimers());

describe("signing in", () => {
  it("begins a session with the right password", async () => {
    const user = await person();
    const id = await signIn({ email: user.email, password }, address());
    const session = await Session.findByPk(id ?? "", { rejectOnEmpty: true });
    expect(session).toMatchObject({ userId: user.id, sessionVersion: 1, endedAt: null, createdAt: new Date() });
    expect(await AuditEvent.count({ where: { actorId: user.id, action: "sign-in" } })).toBe(1);
  });

  it("takes the address in any case and with spaces around it", async () => {
    const user = await person();
    expect(await attempt(` ${user.email.toUpperCase()} `, address(), password)).toBe("in");
  });

  it("answers a wrong password, an unknown address and an unanswered invitation alike", async () => {
    const [known, invited] = [await person(), await buildUser({ passwordHash: null })];
    expect(await attempt(known.email, address())).toBeNull();
    expect(await attempt("nobody@example.test", address())).toBeNull();
    expect(await attempt(invited.email, address())).toBeNull();
  });

  it("takes as long for an unknown address as for a wrong password", async () => {
    vi.useRealTimers();
    const user = await person();
    const timed = async (email: string) => {
      const from = performance.now();
      await attempt(email, address());
      return performance.now() - from;
    };
    await timed(user.email);
    const [known, unknown] = [await timed(user.email), await timed("nobody@example.test")];
    // Without the comparison it would be a few ms; the bound is wide because the machine is shared.
    expect(unknown).toBeGreaterThan(known / 4);
  });

  it("writes a refused try down, but never an address that nobody has", async () => {
    const user = await person();
    await attempt(user.email, address());
    const typed = "my-own-passw0rd@example.test";
    await attempt(typed, address());
    const refused = await AuditEvent.findAll({ where: { action: "sign-in refused" } });
    expect(refused.filter(({ subjectId }) => subjectId === user.id)).toHaveLength(1);
    expect(JSON.stringify(refused)).not.toContain(typed);
    expect(JSON.stringify(await SignInAttempt.findAll())).not.toContain("example.test");
  });
});

describe("slowed sign-in", () => {
  it("answers the first three failures at once and makes the fourth wait", async () => {
    const { email } = await person();
    expect(await failTimes(4, email, address())).toEqual([null, null, null, "wait 1"]);
  });

  it("waits 1, 2, 4, 8, 16 and then 30 seconds, and never longer", async () => {
    const [{ email }, from] = [await person(), address()];
    await failTimes(3, email, from);
    const waits: (string | null)[] = [];
    for (let n = 0; n < 8; n += 1) waits.push(await failAndWait(email, from));
    expect(waits).toEqual([1, 2, 4, 8, 16, 30, 30, 30].map((seconds) => `wait ${seconds}`));
  });

  it("refuses even the right password during the wait, and takes it after", async () => {
    const [{ email }, from] = [await person(), address()];
    await failTimes(4, email, from);
    expect(await attempt(email, from, password)).toBe("wait 1");
    vi.setSystemTime(Date.now() + 1000);
    expect(await attempt(email, from, password)).toBe("in");
  });

  it("takes the right password on the fourth try", async () => {
    const [{ email }, from] = [await person(), address()];
    await failTimes(3, email, from);
    expect(await attempt(email, from, password)).toBe("in");
  });

  it("does not count what is tried during a wait", async () => {
    const [{ email }, from] = [await person(), address()];
    await failTimes(4, email, from);
    expect(await failTimes(5, email, from)).toEqual(Array(5).fill("wait 1"));
    vi.setSystemTime(Date.now() + 1000);
    expect(await attempt(email, from)).toBe("wait 2");
  });

  it("looks at one password a wait, however many come at once", async () => {
    const [{ email }, from] = [await person(), address()];
    await failTimes(3, email, from);
    const answers = await Promise.all(Array.from({ length: 6 }, () => attempt(email, from)));
    expect(answers).toEqual(Array(6).fill("wait 1"));
    const refused = await AuditEvent.count({
      where: { action: "sign-in refused", subjectId: (await User.findOne({ where: { email } }))?.id ?? "" },
    });
    expect(refused).toBe(4);
  });

  it("slows nobody else: another account there, or the same account elsewhere", async () => {
    const [one, other, from] = [await person(), await person(), address()];
    await failTimes(4, one.email, from);
    expect(await attempt(other.email, from)).toBeNull();
    expect(await attempt(one.email, address(), password)).toBe("in");
  });

  it("slows an address that nobody has in the same way", async () => {
    expect(await failTimes(4, `${randomUUID()}@example.test`, address())).toEqual([null, null, null, "wait 1"]);
  });

  it("begins anew after a success", async () => {
    const [{ email }, from] = [await person(), address()];
    await failTimes(3, email, from);
    await attempt(email, from, password);
    expect(await failTimes(3, email, from)).toEqual([null, null, null]);
  });

  it("does not slow an account where it lately succeeded, up to ten failures in a row", async () => {
    const [{ email }, from] = [await person(), address()];
    await attempt(email, from, password);
    expect(await failTimes(11, email, from)).toEqual([...Array(10).fill(null), "wait 1"]);
  });

  it("forgets where an account succeeded after twelve hours", async () => {
    const [{ email }, from] = [await person(), address()];
    await attempt(email, from, password);
    vi.setSystemTime(Date.now() + 12 * 60 * 60_000 + 1000);
    expect(await failTimes(4, email, from)).toEqual([null, null, null, "wait 1"]);
  });
});

describe("next-auth's provider", () => {
  interface Provider {
    options: { authorize: (sent: unknown, request: { headers: Record<string, string> }) => Promise<unknown> };
  }
  const authorize = (sent: unknown, from: string) =>
    (authOptions().providers[0] as unknown as Provider).options.authorize(sent, {
      headers: { "x-forwarded-for": from },
    });

  it("gives the session's id for its cookie, and nothing else about the person", async () => {
    const user = await person();
    const given = await authorize({ email: user.email, password, csrfToken: "of next-auth" }, address());
    expect(given).toEqual({ id: expect.stringMatching(/^[0-9a-f-]{36}$/) as string });
  });

  it("gives nobody for what is no e-mail address or no password", async () => {
    expect(await authorize({ email: "therapist", password }, address())).toBeNull();
    expect(await authorize({}, address())).toBeNull();
  });

  it("passes the wait on in its message, the only thing next-auth keeps of an error", async () => {
    const [{ email }, from] = [await person(), address()];
    await failTimes(3, email, from);
    await expect(authorize({ email, password: "wrong" }, from)).rejects.toThrow("slow-down:1");
  });

  it("reads the address that the nearest proxy wrote, not what the sender put before it", async () => {
    const [{ email }, from] = [await person(), address()];
    await failTimes(3, email, from);
    await expect(authorize({ email, password: "wrong" }, `203.0.113.9, ${from}`)).rejects.toThrow("slow-down:1");
  });
});
