import { mkdtemp, readFile, realpath, rm, writeFile } from "node:fs/promises";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { Client } from "pg";
import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { freePort } from "@/lib/launch/ports.mjs";
import { endProcesses } from "@/lib/launch/system-processes.mjs";
import { processesOf, run, untilAnswering, untilDatabase, type Launcher } from "./launcher";

const START = ["node", "lib/launch/start.mjs"];

let data: string;
let port: number;
let launcher: Launcher | undefined;

const settings = () => ({ NEAPTIDE_DATA: data, PORT: String(port) });

async function start(command = START) {
  launcher = run(command, settings());
  return untilAnswering(launcher);
}

async function stopWith(signal: NodeJS.Signals) {
  launcher?.child.kill(signal);
  return launcher?.exitCode;
}

/** A database made anew has another id, so the same id means kept data. */
async function databaseId() {
  const password = await readFile(join(data, "secrets", "database-owner"), "utf8");
  const pgPort = Number(await readFile(join(data, "pg-port"), "utf8"));
  const client = new Client({
    host: "127.0.0.1",
    port: pgPort,
    user: "neaptide_owner",
    password,
    database: "neaptide",
  });
  await client.connect();
  const { rows } = await client.query<{ id: string }>("SELECT oid AS id FROM pg_database WHERE datname = 'neaptide'");
  await client.end();
  return rows[0]?.id;
}

beforeAll(async () => {
  // mkdtemp makes it 0700: PostgreSQL works there although it does not run as root.
  data = await realpath(await mkdtemp(join(tmpdir(), "faults-")));
  port = await freePort();
});

afterEach(async () => {
  await stopWith("SIGTERM");
  launcher = undefined;
});

afterAll(async () => {
  await endProcesses(processesOf(data), "SIGKILL");
  await rm(data, { recursive: true });
});

describe("npm start", () => {
  it("TERM to npm leaves no process, and the next start finds the same data", async () => {
    await start(["npm", "start"]);
    const first = await databaseId();
    expect(processesOf(data).length).toBeGreaterThan(1);
    await stopWith("SIGTERM");
    await expect.poll(() => processesOf(data), { timeout: 20_000 }).toEqual([]);
    await start();
    expect(await databaseId()).toBe(first);
  });

  it("Ctrl-C ends with code 0 and leaves no process", async () => {
    const url = await start();
    expect((await fetch(`${url}/api/health`)).status).toBe(200);
    expect(await stopWith("SIGINT")).toBe(0);
    expect(processesOf(data)).toEqual([]);
  });

  it("a start after kill -9 recovers, though the pid file names a live program that is another's", async () => {
    await start();
    const first = await databaseId();
    await stopWith("SIGKILL");
    expect(processesOf(data).length).toBeGreaterThan(1);
    await endProcesses(processesOf(data), "SIGKILL");
    const pidFile = join(data, "pg", "postmaster.pid");
    await writeFile(pidFile, (await readFile(pidFile, "utf8")).replace(/^\d+/, String(process.pid)));
    await start();
    expect(await databaseId()).toBe(first);
  });

  it("a start after kill -9 ends the server and the PostgreSQL that were left running", async () => {
    await start();
    await stopWith("SIGKILL");
    const orphans = processesOf(data);
    await start();
    expect(processesOf(data).filter((pid: number) => orphans.includes(pid))).toEqual([]);
  });

  it("a second start on the same data is refused in a sentence and disturbs nothing", async () => {
    const url = await start();
    const second = run(START, { ...settings(), PORT: String(await freePort()) });
    expect(await second.exitCode).toBe(1);
    expect(second.printed()).toMatch(/^npm start at http:\/\/127\.0\.0\.1:\d+ already runs on /);
    expect((await fetch(`${url}/api/health`)).status).toBe(200);
  });

  it("two data folders work at once, each on a PostgreSQL port of its own", async () => {
    await start();
    const otherData = await realpath(await mkdtemp(join(tmpdir(), "faults-")));
    const other = run(["npm", "run", "-s", "db"], { NEAPTIDE_DATA: otherData });
    const otherPort = new URL(await untilDatabase(other)).port;
    expect(otherPort).not.toBe(await readFile(join(data, "pg-port"), "utf8"));
    other.child.kill("SIGTERM");
    await other.exitCode;
    expect(processesOf(otherData)).toEqual([]);
    await rm(otherData, { recursive: true });
  });

  it("a taken port is refused in a sentence and leaves nothing running", async () => {
    const other = createServer().listen(port, "127.0.0.1");
    const refused = run(["npm", "start"], settings());
    expect(await refused.exitCode).toBe(1);
    expect(refused.printed()).toContain(`Port ${port} is taken by another program.`);
    expect(processesOf(data)).toEqual([]);
    await new Promise((resolve) => other.close(resolve));
  });

  it("a database address without production mode is refused before anything starts", async () => {
    const refused = run(START, { ...settings(), DATABASE_URL: "postgres://app:pw@127.0.0.1:5432/chart" });
    expect(await refused.exitCode).toBe(1);
    expect(refused.printed()).toMatch(/^DATABASE_URL is set, but NEAPTIDE_MODE is not 'production'/);
  });

  it("no process of the web server has the owner's address in its environment", async () => {
    await start();
    const environments = await Promise.all(
      processesOf(data).map((pid: number) => readFile(`/proc/${pid}/environ`, "utf8")),
    );
    const withDatabase = environments.filter((environment) => environment.includes("\0DATABASE_URL="));
    expect(withDatabase.length).toBeGreaterThan(0);
    expect(environments.filter((environment) => environment.includes("neaptide_owner"))).toEqual([]);
  });
});

describe("npm run seed", () => {
  it("is refused while the server runs", async () => {
    await start();
    const seed = run(["npm", "run", "-s", "seed"], settings());
    expect(await seed.exitCode).toBe(1);
    expect(seed.printed()).toContain("Stop it there");
  });
});
