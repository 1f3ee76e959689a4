import { readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { ruleIds } from "./rule-ids";

const testsFolder = fileURLToPath(new URL("../../", import.meta.url));

const testFiles = readdirSync(testsFolder, { recursive: true, encoding: "utf8" }).filter((name) =>
  /\.(test|spec)\.tsx?$/.test(name),
);

/** Ids at the beginning of each test's title: one or several, 'F5 F7 …'. */
function namedIn(source: string): string[] {
  const titles = source.matchAll(
    /\b(?:it|test)(?:\.\w+(?:\((?:[^()]|\([^()]*\))*\))?)?\(\s*["'`]((?:[VFSAONTH]\d+ )+)/g,
  );
  return [...titles].flatMap(([, ids = ""]) => ids.trim().split(" "));
}

const named = new Set(testFiles.flatMap((name) => namedIn(readFileSync(`${testsFolder}${name}`, "utf8"))));

describe("rule ids", () => {
  it("reads several ids of one title", () => {
    expect(namedIn('it("F5 F7 a fact", () => {})')).toEqual(["F5", "F7"]);
    expect(namedIn('it.each([[1], [f(2)]])("S2 a fact of %s", () => {})')).toEqual(["S2"]);
    expect(namedIn('it("no id F7", () => {})')).toEqual([]);
  });

  it("every rule on values, freshness, states and findings is named by a test", () => {
    const unnamed = ruleIds.filter((id) => !named.has(id));
    console.info(`rules that no test names: ${unnamed.join(", ") || "none"}`);
    expect(unnamed).toEqual([]);
  });
});
