import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { mappings } from "./mappings";
import { missingFunctions, waitsFor } from "./not-yet-run";
import { publishedValues, type PublishedValue } from "./published-values";

const core = ["lib/physiology", "lib/protocol", "lib/format"];

function sourcesOf(folder: string): string[] {
  return readdirSync(folder, { recursive: true, encoding: "utf8" })
    .filter((file) => file.endsWith(".ts"))
    .map((file) => readFileSync(`${folder}/${file}`, "utf8"));
}

const sources = core.flatMap(sourcesOf).join("\n");

function isExported(name: string): boolean {
  return new RegExp(`export (?:async )?(?:function|const) ${name}\\b`).test(sources);
}

/** Keys of a published value that the product does not answer; all of a refusal, or none. */
function unansweredKeys(value: PublishedValue): string[] {
  const mapped = mappings[value.item]?.(value.inputs) ?? null;
  if (mapped === null) return Object.keys(value.expected);
  if ("refuse" in value.expected) return [];
  const actual = mapped.answer();
  return Object.keys(value.expected).filter((key) => !(key in actual));
}

function listed(): string {
  return missingFunctions
    .map((missing) => {
      const ids = publishedValues.filter((value) => waitsFor(value)?.missing === missing).map(({ id }) => id);
      return `  ${missing}: ${ids.join(", ")}`;
    })
    .join("\n");
}

describe("published values not yet run", () => {
  test("every published value runs whole, or names the missing function for what does not", () => {
    const apart = publishedValues.filter((value) => {
      const waiting = waitsFor(value)?.keys ?? [];
      return unansweredKeys(value).join() !== waiting.join();
    });
    expect(apart.map(({ id }) => id)).toEqual([]);
  });

  test("an exported function is found where it exists", () => {
    expect(isExported("pfRatio")).toBe(true);
    expect(isExported("noSuchFunction")).toBe(false);
  });

  test.each(missingFunctions)("%s is still missing, or its published values run", (missing) => {
    expect(isExported(missing)).toBe(false);
  });

  test("the list names at least one value for each missing function, and is printed", () => {
    const waitedFor = new Set(publishedValues.map((value) => waitsFor(value)?.missing));
    expect(missingFunctions.filter((missing) => !waitedFor.has(missing))).toEqual([]);
    const count = publishedValues.filter((value) => waitsFor(value) !== null).length;
    console.info(
      `Published values not yet run, by missing function (${count} of ${publishedValues.length}):\n${listed()}`,
    );
  });
});
