import { spawn } from "node:child_process";
import { once } from "node:events";
import { Refusal } from "./refusal.mjs";

const running = new Set();
let closed = false;

/**
 * Starts a program in a session of its own, so that Ctrl-C in the terminal reaches the launcher alone and the order
 * of stopping stays the launcher's. `ended` resolves with `{ code, signal }`. A `service` is stopped by whoever started
 * it, last; what must `finish` is waited for.
 */
export function start(command, args, { service = false, finish = false, ...options } = {}) {
  if (closed) throw new Refusal("Stopping.");
  const child = spawn(command, args, { stdio: "inherit", ...options, detached: true });
  const ended = new Promise((resolve) => {
    child.once("error", (error) => resolve({ code: 127, signal: null, error }));
    child.once("exit", (code, signal) => resolve({ code, signal }));
  });
  const started = { child, pid: child.pid, ended, service, finish };
  running.add(started);
  void ended.then(() => running.delete(started));
  return started;
}

/** Runs a program to its end; resolves with its exit code, 128 or more when a signal ended it. */
export async function run(command, args, options = {}) {
  const { code, error } = await start(command, args, options).ended;
  if (error) throw new Refusal(`${command} could not be started: ${error.message}`);
  return code ?? 128;
}

/** Runs a program with `input` on its standard input and collects what it prints. */
export async function capture(command, args, { input = "", ...options } = {}) {
  const started = start(command, args, { ...options, stdio: ["pipe", "pipe", "pipe"] });
  const { child } = started;
  let stdout = "";
  let stderr = "";
  child.stdout?.setEncoding("utf8").on("data", (text) => (stdout += text));
  child.stderr?.setEncoding("utf8").on("data", (text) => (stderr += text));
  // A program that ends early closes the pipe; its exit code says so better than EPIPE.
  child.stdin?.on("error", () => undefined).end(input);
  const closedPipes = child.pid ? once(child, "close") : undefined;
  const { code, error } = await started.ended;
  await closedPipes;
  return { code: code ?? 128, stdout, stderr: error ? error.message : stderr };
}

function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal);
  } catch (error) {
    if (error.code !== "ESRCH") throw error;
  }
}

/** The promise's value, or 'late' when it takes longer. */
export function within(promise, milliseconds) {
  let timer;
  const late = new Promise((resolve) => (timer = setTimeout(resolve, milliseconds, "late")));
  return Promise.race([promise, late]).finally(() => clearTimeout(timer));
}

/** Asks with `signal`, waits, then kills. What the program started in its group goes with it. */
export async function stop(started, signal = "SIGTERM", graceMs = 10_000) {
  if (!started.pid || started.stopped) return;
  started.stopped = true;
  if (running.has(started)) process.kill(started.pid, signal);
  await within(started.ended, graceMs);
  signalGroup(started.pid, "SIGKILL");
  await started.ended;
}

/** Stops all that is no service, and lets nothing start any more. Answers whether there was something to stop. */
export async function stopWork() {
  closed = true;
  const work = [...running].filter((started) => !started.service);
  await Promise.all(work.map((started) => (started.finish ? started.ended : stop(started, "SIGTERM", 5_000))));
  return work.length > 0;
}

/** From now on `start` refuses: used between a signal and the end. */
export function startNothingMore() {
  closed = true;
}
