import { rm } from "node:fs/promises";
import { basename, join } from "node:path";
import { commandLine, endProcesses, processesWhere, workingFolder } from "./system-processes.mjs";

function isServer(pid, folder) {
  const [program = "", ...args] = commandLine(pid);
  return basename(program) === "postgres" && args.includes(folder);
}

// When the server itself was killed, a child of it may still hold the shared memory for a moment.
function isItsChild(pid, folder) {
  const [title = ""] = commandLine(pid);
  return title.startsWith("postgres: ") && workingFolder(pid) === folder;
}

/** Ends a server that an earlier launcher left behind on this folder, and its pid file. */
export async function endOrphanedServer(folder) {
  const orphans = processesWhere((pid) => isServer(pid, folder) || isItsChild(pid, folder));
  // INT is PostgreSQL's fast shutdown: sessions end, nothing is lost.
  await endProcesses(orphans, "SIGINT", 20_000);
  // The number in a pid file left behind may by now be another program's, and PostgreSQL would refuse to start.
  await rm(join(folder, "postmaster.pid"), { force: true });
}
