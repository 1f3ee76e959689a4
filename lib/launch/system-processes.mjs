import { readFileSync, readdirSync, readlinkSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";

function read(pid, name) {
  try {
    return readFileSync(`/proc/${pid}/${name}`, "utf8");
  } catch {
    // Gone meanwhile, or another user's.
    return "";
  }
}

/** Arguments a process was started with; empty when it is gone or not ours to read. */
export const commandLine = (pid) => read(pid, "cmdline").split("\0").filter(Boolean);

/** The folder a process works in; empty when it is gone or not ours to read. */
export function workingFolder(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`);
  } catch {
    return "";
  }
}

/** Whether the process was started with `name=value` in its environment. */
export const hasVariable = (pid, name, value) => read(pid, "environ").split("\0").includes(`${name}=${value}`);

/** A zombie is dead: it only waits for its parent to notice. */
function isAlive(pid) {
  const stat = read(pid, "stat");
  return stat !== "" && !/^\d+ \(.*\) [ZX]/s.test(stat);
}

/** Ids of all live processes that satisfy the test, never our own. */
export function processesWhere(test) {
  return readdirSync("/proc")
    .filter((name) => /^\d+$/.test(name))
    .map(Number)
    .filter((pid) => pid !== process.pid && isAlive(pid) && test(pid));
}

function signal(pid, name) {
  try {
    process.kill(pid, name);
  } catch (error) {
    if (error.code !== "ESRCH") throw error;
  }
}

/** Ends processes that are not our children: asks, waits, then kills. */
export async function endProcesses(pids, askWith, graceMs = 10_000) {
  for (const pid of pids) signal(pid, askWith);
  const deadline = Date.now() + graceMs;
  while (pids.some(isAlive) && Date.now() < deadline) await sleep(50);
  for (const pid of pids.filter(isAlive)) signal(pid, "SIGKILL");
  while (pids.some(isAlive)) await sleep(20);
}
