import { existsSync } from "node:fs";
import { readFile, rm } from "node:fs/promises";
import { join } from "node:path";
import { childEnvironment } from "./child-environment.mjs";
import { installPackage } from "./debian-packages.mjs";
import { demoDatabase } from "./demo.mjs";
import { freePort } from "./ports.mjs";
import { localValues } from "./prepare.mjs";
import { run, stop } from "./processes.mjs";
import { countPlaywright, judge, readReport } from "./report.mjs";
import { warningsIn } from "./server-log.mjs";
import { root } from "./settings.mjs";
import { serve } from "./web.mjs";

const CHROMIUM = "/usr/bin/chromium";

async function serveSeeded(cluster, data) {
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const urls = await demoDatabase(cluster, { data, url, mayCreateDatabases: true });
  const values = await localValues("test", { data, url, databaseUrl: urls.app });
  const log = join(data, "server.log");
  const server = await serve({ command: "start", data, port, url, values, log, print: false });
  return { server, url, log };
}

async function runPlaywright({ data, url, paths, report }) {
  await rm(report, { force: true });
  const args = [join(root, "node_modules", "@playwright", "test", "cli.js"), "test", ...paths];
  const env = childEnvironment(data, { BASE_URL: url, PLAYWRIGHT_JSON_OUTPUT_FILE: report });
  return run(process.execPath, args, { cwd: root, env, stdio: ["ignore", "inherit", "inherit"] });
}

async function printWarnings(log) {
  const warnings = warningsIn(await readFile(log, "utf8"));
  if (warnings.length === 0) return;
  console.log(`\nWhile the browser tests ran, the server said (${log}):\n${warnings.join("\n")}`);
}

/** Runs the browser tests against a built server with a seeded database of its own. */
export async function runE2e({ cluster, data, paths }) {
  if (!existsSync(CHROMIUM)) await installPackage("chromium", "Chromium, for the browser tests,");
  const { server, url, log } = await serveSeeded(cluster, data);
  const report = join(data, "e2e.json");
  const exitCode = await runPlaywright({ data, url, paths, report });
  await stop(server);
  await printWarnings(log);
  return { suite: "e2e", ...judge(countPlaywright(await readReport(report)), exitCode) };
}
