import { expect, test } from "vitest";
import { mappings } from "./mappings";
import type { MappedRun } from "./mappings/mapping";
import { publishedValuesOf, titleOf, type PublishedValue } from "./published-values";
import { refusals } from "./refusals";

function expectSame(actual: unknown, expected: unknown, tolerance: number, key: string): void {
  if (typeof expected === "number") {
    expect(actual, key).toBeTypeOf("number");
    // Float noise is no disagreement, even where a table asks for equality.
    expect(Math.abs(Number(actual) - expected), `${key}: got ${String(actual)}`).toBeLessThanOrEqual(tolerance + 1e-9);
  } else if (typeof expected === "object" && expected !== null) {
    const expectedEntries = Object.entries(expected);
    expect(Object.keys(actual as object), key).toEqual(expectedEntries.map(([name]) => name));
    const actualByName = actual as Record<string, unknown>;
    expectedEntries.forEach(([name, each]) => expectSame(actualByName[name], each, tolerance, `${key}.${name}`));
  } else {
    expect(actual, key).toBe(expected);
  }
}

function expectRefusal({ answer }: MappedRun, refusal: unknown): void {
  const message = refusals[String(refusal)];
  expect(message, `no sentence for ${String(refusal)}`).toBeDefined();
  expect(answer).toThrow(RangeError);
  expect(answer).toThrow(message);
}

/** Compares every key that the product answers; the others stand, with the function they wait for, in not-yet-run.ts. */
function expectPublished(mapped: MappedRun, { expected, tolerance }: PublishedValue): void {
  if ("refuse" in expected) return expectRefusal(mapped, expected.refuse);
  const actual = mapped.answer();
  const answered = Object.keys(expected).filter((key) => key in actual);
  expect(answered).not.toHaveLength(0);
  answered.forEach((key) => expectSame(actual[key], expected[key], mapped.tolerances?.[key] ?? tolerance ?? 0, key));
}

/** One test for every published value of an item that a function of the product answers. */
export function runPublishedValues(item: string): void {
  const mapping = mappings[item];
  const runs = publishedValuesOf(item).flatMap((value) => {
    const mapped = mapping?.(value.inputs) ?? null;
    return mapped === null ? [] : [{ title: titleOf(value), value, mapped }];
  });
  test.each(runs)("$title", ({ value, mapped }) => expectPublished(mapped, value));
}
