import { describe, expect, it } from "vitest";
import { countPlaywright, countVitest, judge, lastLine, suiteLine } from "@/lib/launch/report.mjs";
import { warningsIn } from "@/lib/launch/server-log.mjs";
import { chooseSuites, SUITES } from "@/lib/launch/suites.mjs";

const file = (name: string, status: string, ...tests: string[]) => ({
  name: `/srv/checkout/tests/${name}`,
  status,
  assertionResults: tests.map((test) => ({ status: test })),
});

describe("the sum of a run", () => {
  const report = {
    testResults: [
      file("unit/a.test.ts", "passed", "passed", "passed"),
      file("unit/b.test.ts", "failed", "passed", "failed"),
      file("integration/c.test.ts", "failed"),
    ],
  };

  it("counts each suite by its folder", () => {
    expect(countVitest(report, "unit")).toEqual({ passed: 3, failed: 1, skipped: 0 });
  });

  it("counts a file that could not be loaded as one failure", () => {
    expect(countVitest(report, "integration")).toEqual({ passed: 0, failed: 1, skipped: 0 });
  });

  it("a suite without a test is a failure", () => {
    expect(judge(countVitest(report, "component"), 0)).toMatchObject({ failed: 1, why: "no test ran" });
  });

  it("a runner that crashed without a report is a failure", () => {
    expect(judge(countVitest(undefined, "unit"), 134)).toMatchObject({ passed: 0, failed: 1 });
    expect(judge(countPlaywright(undefined), 1)).toMatchObject({ passed: 0, failed: 1 });
  });

  it("a runner that failed although every test passed is a failure", () => {
    expect(judge({ passed: 5, failed: 0, skipped: 0 }, 1)).toMatchObject({ passed: 5, failed: 1 });
  });

  it("a browser test that passed only at a second try has failed", () => {
    expect(countPlaywright({ stats: { expected: 4, unexpected: 1, flaky: 1 } })).toEqual({
      passed: 4,
      failed: 2,
      skipped: 0,
    });
  });

  it("says how many tests did not run", () => {
    const count = countVitest({ testResults: [file("unit/a.test.ts", "passed", "passed", "skipped")] }, "unit");
    expect(suiteLine({ suite: "unit", why: undefined, ...count })).toBe("unit: 1 passed, 0 failed, 1 skipped");
  });

  it("ends in one line", () => {
    expect(lastLine({ passed: 12, failed: 0 })).toBe("tests: 12 passed, 0 failed");
  });
});

describe("which suites run", () => {
  it("without a name, all of them", () => {
    expect(chooseSuites([])).toEqual({ suites: SUITES, paths: [] });
  });

  it("the named ones, in their own order, narrowed by paths", () => {
    const chosen = chooseSuites(["e2e", "unit", "tests/e2e/record.spec.ts"]);
    expect(chosen).toEqual({ suites: ["unit", "e2e"], paths: ["tests/e2e/record.spec.ts"] });
  });

  it("a name that is no suite is refused, so that nothing passes by running nothing", () => {
    expect(() => chooseSuites(["units"])).toThrow("units");
  });
});

describe("the server's log", () => {
  it("shows warnings and errors of the application and of Next", () => {
    const warning = '{"level":40,"msg":"slow"}';
    const log = ['{"level":30,"msg":"no error"}', warning, "⨯ Error: boom", "GET /beds 200", ""].join("\n");
    expect(warningsIn(log)).toEqual([warning, "⨯ Error: boom"]);
  });
});
