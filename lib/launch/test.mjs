import { join } from "node:path";
import { ensureBuilt } from "./build.mjs";
import { startCluster } from "./cluster.mjs";
import { endLeftBehind, takeDataFolder } from "./data-lock.mjs";
import { ensureDatabase } from "./database.mjs";
import { ensureInstalled } from "./install.mjs";
import { atEnd, launch } from "./lifetime.mjs";
import { lastLine, suiteLine } from "./report.mjs";
import { runE2e } from "./run-e2e.mjs";
import { runVitest } from "./run-vitest.mjs";
import { readSettings, root } from "./settings.mjs";
import { chooseSuites, VITEST_SUITES } from "./suites.mjs";

const tally = { passed: 0, failed: 0, finished: false };

function add(result) {
  tally.passed += result.passed;
  tally.failed += result.failed;
  console.log(suiteLine(result));
}

async function clusterFor(suites, data) {
  if (!suites.includes("integration") && !suites.includes("e2e")) return undefined;
  return startCluster({ data, durable: false });
}

async function databaseAddresses(cluster, data) {
  if (!cluster) return {};
  const urls = await ensureDatabase(cluster, { data, mayCreateDatabases: true });
  return { TEST_DATABASE_ADMIN_URL: urls.owner, TEST_DATABASE_APP_URL: urls.app };
}

async function runSuites({ suites, paths }, data) {
  const cluster = await clusterFor(suites, data);
  const values = await databaseAddresses(cluster, data);
  const fast = VITEST_SUITES.filter((suite) => suites.includes(suite));
  if (fast.length > 0) (await runVitest({ suites: fast, paths, data, values })).forEach(add);
  if (!suites.includes("e2e") && !suites.includes("faults")) return;
  await ensureBuilt(root, data);
  if (suites.includes("e2e")) add(await runE2e({ cluster, data, paths }));
  if (suites.includes("faults")) (await runVitest({ suites: ["faults"], paths, data, values: {} })).forEach(add);
}

/** `npm test`: every suite, or the ones named. The last line sums them; whatever kept the run from its end is a failure. */
await launch(async () => {
  atEnd(() => console.log(lastLine({ ...tally, failed: tally.failed + (tally.finished ? 0 : 1) })));
  const chosen = chooseSuites(process.argv.slice(2));
  const data = await takeDataFolder(join(readSettings().data, "test"), "npm test");
  atEnd(() => endLeftBehind(data));
  await ensureInstalled(root, data);
  await runSuites(chosen, data);
  tally.finished = true;
  return tally.failed === 0 ? 0 : 1;
});
