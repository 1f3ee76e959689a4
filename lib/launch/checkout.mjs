import { setTimeout as sleep } from "node:timers/promises";
import { takeLock } from "./lock.mjs";
import { Refusal } from "./refusal.mjs";
import { hasVariable, processesWhere } from "./system-processes.mjs";

const USES_PACKAGES = "NEAPTIDE_USES_PACKAGES_OF";
const USES_BUILD = "NEAPTIDE_USES_BUILD_OF";

/** Variables by which other launchers see what a server reads. `next dev` builds in a folder of its own. */
export const usesOf = (root, command) => ({
  [USES_PACKAGES]: root,
  ...(command === "start" ? { [USES_BUILD]: root } : {}),
});

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

// Changing files under a running server would break it.
function refuseWhileUsed(root, variable, what) {
  if (processesWhere((pid) => hasVariable(pid, variable, root)).length === 0) return;
  throw new Refusal(
    `${what} changed since the running server of this checkout started. Stop that server first, then run this again.`,
  );
}

export const refuseWhilePackagesUsed = (root) => refuseWhileUsed(root, USES_PACKAGES, "The list of packages");
export const refuseWhileBuildUsed = (root) => refuseWhileUsed(root, USES_BUILD, "The sources");
