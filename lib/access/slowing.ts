import { createHash } from "node:crypto";
import { RateLimiterPostgres, RateLimiterRes } from "rate-limiter-flexible";
import { sequelize } from "@/db/connection";
import { AppError } from "@/lib/contracts";

/** The first failures in a row cost no wait: a mistyped password at the bedside is common. */
const FREE_FAILURES = 3;
/** Where this account lately succeeded from this address, mistyping is likelier than guessing. */
const FREE_FAILURES_WHERE_KNOWN = 10;
const LONGEST_WAIT_S = 30;
const HOUR_S = 60 * 60;

/** 1, 2, 4 … 30 s: what follows the n-th failure beyond the free ones, n from 1. */
function waitSeconds(turn: number): number {
  return Math.min(LONGEST_WAIT_S, 2 ** (turn - 1));
}

function limiter(keyPrefix: string, duration: number) {
  return new RateLimiterPostgres({
    storeClient: sequelize,
    storeType: "sequelize",
    tableName: "sign_in_attempts",
    tableCreated: true,
    keyPrefix,
    duration,
    points: 1,
  });
}

function makeLimiters() {
  return {
    failures: limiter("failures", HOUR_S),
    turns: limiter("turns", HOUR_S),
    wait: limiter("wait", LONGEST_WAIT_S),
    known: limiter("known", 12 * HOUR_S),
  };
}

let limiters: ReturnType<typeof makeLimiters> | undefined;

/** An account as typed and the address it is tried from. */
export interface Pair {
  email: string;
  address: string;
}

/** Of one length, and no e-mail address in the table. */
function keyOf({ email, address }: Pair): string {
  return createHash("sha256").update(`${email.trim().toLowerCase()}\n${address}`).digest("hex");
}

function slowDown(seconds: number): AppError {
  return new AppError("slow-down", `Too many tries in a row. Wait ${seconds} s, then try again.`, {
    headers: { "Retry-After": String(seconds) },
  });
}

/**
 * Takes the one try that a wait allows, and answers how long the next one waits if this fails. Whoever comes while the
 * wait runs is told how long it still lasts.
 */
async function takeTurn(key: string): Promise<number> {
  const { wait, failures, turns } = (limiters ??= makeLimiters());
  // Counted by turns, not by tries: those that come at once and are not looked at make the wait no longer.
  const seconds = waitSeconds(((await turns.get(key))?.consumedPoints ?? 0) + 1);
  try {
    await wait.consume(key, 1, { customDuration: seconds });
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    await failures.reward(key, 1);
    throw slowDown(Math.ceil(refusal.msBeforeNext / 1000));
  }
  await turns.penalty(key, 1);
  return seconds;
}

/**
 * Runs one try of a password. From the fourth failure in a row of an account from an address each failure is followed
 * by a wait of 1, 2, 4 … 30 s; the right password enters as soon as the wait is over, however many failures there were.
 * @throws AppError `slow-down` with Retry-After, during a wait and on the failure that begins one
 */
export async function slowed<Result>(pair: Pair, attempt: () => Promise<Result | null>): Promise<Result | null> {
  const { failures, turns, wait, known } = (limiters ??= makeLimiters());
  const key = keyOf(pair);
  const waiting = await wait.get(key);
  if (waiting && waiting.msBeforeNext > 0) throw slowDown(Math.ceil(waiting.msBeforeNext / 1000));
  const free = (await known.get(key)) ? FREE_FAILURES_WHERE_KNOWN : FREE_FAILURES;
  // Counted before the password is looked at, so that many tries at once are not all looked at.
  const { consumedPoints } = await failures.penalty(key, 1);
  const seconds = consumedPoints > free ? await takeTurn(key) : 0;
  const result = await attempt();
  if (result === null && seconds > 0) throw slowDown(seconds);
  if (result === null) return null;
  await Promise.all([failures, turns, wait].map((each) => each.delete(key)));
  await known.set(key, 1, 12 * HOUR_S);
  return result;
}
