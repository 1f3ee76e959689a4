import { rm } from "node:fs/promises";
import { join } from "node:path";
import { childEnvironment } from "./child-environment.mjs";
import { run } from "./processes.mjs";
import { countVitest, judge, readReport } from "./report.mjs";
import { root } from "./settings.mjs";

/** Runs suites that are projects of vitest.config.ts in one go; answers each one's result. */
export async function runVitest({ suites, paths, data, values }) {
  const report = join(data, `${suites.join("-")}.json`);
  await rm(report, { force: true });
  const projects = suites.flatMap((suite) => ["--project", suite]);
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
  const args = [join(root, "node_modules", "vitest", "vitest.mjs"), "run", ...projects, ...reporters, ...paths];
  const env = childEnvironment(data, values);
  const exitCode = await run(process.execPath, args, { cwd: root, env, stdio: ["ignore", "inherit", "inherit"] });
  const read = await readReport(report);
  const counts = suites.map((suite) => ({ suite, ...countVitest(read, suite) }));
  // The exit code speaks for all projects together; it explains nothing when one of them already failed.
  const failedAlone = counts.every(({ failed }) => failed === 0) ? exitCode : 0;
  return counts.map(({ suite, ...count }, index) => ({ suite, ...judge(count, index === 0 ? failedAlone : 0) }));
}
