import { closeSync, openSync } from "node:fs";
import { readFile, rm, stat, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { choosePort } from "./cluster-port.mjs";
import { atEnd } from "./lifetime.mjs";
import { makeCluster } from "./make-cluster.mjs";
import { endOrphanedServer } from "./orphaned-postgres.mjs";
import { isFree } from "./ports.mjs";
import { postgresEnvironment } from "./postgres-environment.mjs";
import { postgresPrograms } from "./postgres-programs.mjs";
import { start, stop } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";
import { secret } from "./secrets.mjs";
import { unprivileged } from "./unprivileged.mjs";

const START_TIMEOUT_MS = 60_000;
const LOG_LIMIT_BYTES = 10_000_000;

// A database a test worker, with pools of their own; and nothing here outlives the run.
const FOR_TESTS = { max_connections: 200, fsync: "off", synchronous_commit: "off", full_page_writes: "off" };

const exists = (path) => stat(path).then(Boolean, () => false);

async function openLog(path) {
  const size = await stat(path).then(
    (file) => file.size,
    () => 0,
  );
  return openSync(path, size > LOG_LIMIT_BYTES ? "w" : "a", 0o600);
}

async function startServer({ folder, programs, port, durable, log }) {
  const settings = {
    listen_addresses: "127.0.0.1",
    port,
    unix_socket_directories: "",
    timezone: "UTC",
    log_timezone: "UTC",
    ...(durable ? {} : FOR_TESTS),
  };
  const options = Object.entries(settings).flatMap(([name, value]) => ["-c", `${name}=${value}`]);
  const [command, ...args] = [...(await unprivileged(folder)), join(programs, "postgres"), "-D", folder, ...options];
  const output = await openLog(log);
  try {
    const stdio = ["ignore", output, output];
    return start(command, args, { service: true, cwd: "/", env: postgresEnvironment(), stdio });
  } finally {
    closeSync(output);
  }
}

/** The last line of postmaster.pid says 'ready' once connections are accepted. */
async function untilReady(server, folder) {
  const deadline = Date.now() + START_TIMEOUT_MS;
  let ended = false;
  void server.ended.then(() => (ended = true));
  while (!ended && Date.now() < deadline) {
    const lines = await readFile(join(folder, "postmaster.pid"), "utf8").catch(() => "");
    if (/^ready/m.test(lines)) return true;
    await sleep(30);
  }
  return false;
}

async function startOnSomePort(cluster, wanted, rememberedIn) {
  // A free port can be taken by another checkout in the moment before PostgreSQL listens on it.
  for (let attempt = 1; attempt <= 3; attempt += 1) {
    const port = await choosePort(wanted, rememberedIn);
    const server = await startServer({ ...cluster, port });
    atEnd(() => stop(server, "SIGINT", 20_000));
    if (await untilReady(server, cluster.folder)) {
      await writeFile(rememberedIn, String(port));
      return { server, port };
    }
    await stop(server, "SIGINT", 5_000);
    if (wanted || (await isFree(port))) break;
  }
  const said = await readFile(cluster.log, "utf8").catch(() => "");
  throw new Refusal(
    `PostgreSQL did not start. Its log, ${cluster.log}, ends:\n${said.trimEnd().split("\n").slice(-8).join("\n")}`,
  );
}

/**
 * Starts the cluster of a data folder, made at the first call. It listens on loopback only and stops with the launcher.
 * `durable: false` is for tests: a new cluster each time, with safety against a power cut traded for speed.
 */
export async function startCluster({ data, pgPort, durable = true }) {
  const folder = join(data, "pg");
  await endOrphanedServer(folder);
  if (!durable) await rm(folder, { recursive: true, force: true });
  const programs = await postgresPrograms(folder);
  const password = await secret(data, "postgres-superuser");
  if (!(await exists(folder))) await makeCluster({ folder, programs, password });
  const cluster = { folder, programs, durable, log: join(data, "postgres.log") };
  const { server, port } = await startOnSomePort(cluster, pgPort, join(data, "pg-port"));
  return { port, programs, password, server };
}
