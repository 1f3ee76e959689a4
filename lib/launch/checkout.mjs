import { setTimeout as sleep } from "node:timers/promises";
import { takeLock } from "./lock.mjs";
import { Refusal } from "./refusal.mjs";
import { hasVariable, processesWhere } from "./system-processes.mjs";

/** Carried by a server that reads node_modules and the build of a checkout. */
export const SERVES = "NEAPTIDE_SERVES_FROM";

const WAIT_MS = 15 * 60_000;

/** Runs `change` alone: launchers with other data folders may share the checkout, its packages and its build. */
export async function withCheckoutLock(root, change) {
  const deadline = Date.now() + WAIT_MS;
  let lock = await takeLock(root, "checkout");
  if (!lock) console.log("Another launcher is preparing this checkout; waiting for it.");
  while (!lock) {
    if (Date.now() > deadline)
      throw new Refusal("Another launcher kept this checkout busy for 15 minutes. Stop it, then run this again.");
    await sleep(500);
    lock = await takeLock(root, "checkout");
  }
  try {
    return await change();
  } finally {
    await lock.release();
  }
}

/** Changing files under a running server would break it, so that is refused. */
export function refuseWhileServed(root, why) {
  if (processesWhere((pid) => hasVariable(pid, SERVES, root)).length === 0) return;
  throw new Refusal(
    `${why} since the running server of this checkout started. Stop that server first, then run this again.`,
  );
}
