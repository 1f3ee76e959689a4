import { readFile } from "node:fs/promises";

/** The report a test runner wrote, or undefined when it crashed before that. */
export async function readReport(path) {
  try {
    return JSON.parse(await readFile(path, "utf8"));
  } catch {
    return undefined;
  }
}

const countOf = (tests, status) => tests.filter((test) => test.status === status).length;

function countFile({ status, assertionResults }) {
  const failed = countOf(assertionResults, "failed");
  // A file that could not be loaded has no results; it counts as one failure.
  return {
    passed: countOf(assertionResults, "passed"),
    failed: status === "failed" ? Math.max(failed, 1) : failed,
    skipped: assertionResults.length - countOf(assertionResults, "passed") - failed,
  };
}

function sum(counts) {
  const total = (name) => counts.reduce((all, count) => all + count[name], 0);
  return { passed: total("passed"), failed: total("failed"), skipped: total("skipped") };
}

/** Passed, failed and skipped tests of one suite, told by its folder, in vitest's JSON report. */
export function countVitest(report, suite) {
  const files = report?.testResults ?? [];
  return sum(files.filter((file) => file.name.includes(`/tests/${suite}/`)).map(countFile));
}

/** Passed, failed and skipped tests in Playwright's JSON report. A flaky test has failed. */
export function countPlaywright(report) {
  const { expected = 0, unexpected = 0, flaky = 0, skipped = 0 } = report?.stats ?? {};
  return { passed: expected, failed: Math.max(unexpected + flaky, report?.errors?.length ? 1 : 0), skipped };
}

/**
 * What a run adds to the sum: no test found is a failure, and so is a runner that failed while all its tests passed
 * (a fault outside of a test).
 */
export function judge(count, exitCode) {
  if (count.passed + count.failed === 0) return { ...count, failed: 1, why: "no test ran" };
  if (exitCode !== 0 && count.failed === 0)
    return { ...count, failed: 1, why: `the runner ended with code ${exitCode}` };
  return count;
}

/** One suite's line, under the runner's own report. */
export function suiteLine({ suite, passed, failed, skipped, why }) {
  const notes = [skipped > 0 ? `, ${skipped} skipped` : "", why ? ` (${why})` : ""].join("");
  return `${suite}: ${passed} passed, ${failed} failed${notes}`;
}

export const lastLine = ({ passed, failed }) => `tests: ${passed} passed, ${failed} failed`;
