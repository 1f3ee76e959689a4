import { createWriteStream } from "node:fs";
import { join } from "node:path";
import { createInterface } from "node:readline";
import { setTimeout as sleep } from "node:timers/promises";
import { usesOf } from "./checkout.mjs";
import { childEnvironment } from "./child-environment.mjs";
import { atEnd } from "./lifetime.mjs";
import { start, stop } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";
import { root } from "./settings.mjs";

const HEALTH_TIMEOUT_MS = 120_000;
const HEALTH_ATTEMPT_MS = 5_000;

// Next's own greeting; the launcher says where the server answers once it does.
const GREETING =
  /^\s*(▲ Next\.js|- (Local|Network|Environments|Experiments)\b|✓ (Starting|Ready|Running next\.config)\b|✓ \w+$|$)/;

function forward(stream, log, print) {
  createInterface({ input: stream }).on("line", (line) => {
    log.write(`${line}\n`);
    if (print && !GREETING.test(line)) console.log(line);
  });
}

/** Asks /api/health until it answers 200 or the server is gone. */
async function untilHealthy(server, url) {
  const deadline = Date.now() + HEALTH_TIMEOUT_MS;
  let ended = false;
  void server.ended.then(() => (ended = true));
  while (!ended && Date.now() < deadline) {
    const answer = await fetch(`${url}/api/health`, { signal: AbortSignal.timeout(HEALTH_ATTEMPT_MS) }).catch(
      () => null,
    );
    if (answer?.ok) return true;
    await sleep(100);
  }
  return false;
}

/**
 * Starts Next on 127.0.0.1 (`command` is 'start' or 'dev') and waits until it answers. What it says is kept in `log`
 * and printed unless `print` is false. It stops with the launcher.
 */
export async function serve({ command, data, port, url, values, log, print = true }) {
  const args = [
    join(root, "node_modules", "next", "dist", "bin", "next"),
    command,
    "-H",
    "127.0.0.1",
    "-p",
    String(port),
  ];
  const env = childEnvironment(data, { ...values, ...usesOf(root, command) });
  const server = start(process.execPath, args, { service: true, cwd: root, env, stdio: ["ignore", "pipe", "pipe"] });
  atEnd(() => stop(server, "SIGTERM", 10_000));
  const file = createWriteStream(log, { mode: 0o600 });
  forward(server.child.stdout, file, print);
  forward(server.child.stderr, file, print);
  if (await untilHealthy(server, url)) return server;
  throw new Refusal(`The server did not answer at ${url}/api/health. What it said is kept in ${log}.`);
}
