import { describe, expect, test } from "vitest";
import { chartedRanges, isRefused, isUnusual, pbwHeightCm, type ChartedField } from "@/lib/physiology";
import { catalogue } from "./catalogue";

const bounds = catalogue.flatMap((entry) =>
  Object.entries(entry.ranges).flatMap(([field, range]) => range.map((bound) => ({ ...entry, field, bound }))),
);

const fields = Object.keys(chartedRanges) as ChartedField[];

describe("bounds belong to the range", () => {
  test.each(bounds)("$name lets $field $bound through the door", ({ call, example, field, bound }) => {
    let message = "";
    try {
      call({ ...example, [field]: bound });
    } catch (error) {
      message = error instanceof RangeError ? error.message : "no RangeError";
    }
    // Beside the other example values a bound may make an impossible pair; it is then refused as that.
    expect(message).not.toContain("is outside the allowed");
    expect(message).not.toBe("no RangeError");
  });

  test.each(fields)("%s: its refuse bounds are charted, a step beyond is not", (field) => {
    const { min, max } = chartedRanges[field].refuse;
    expect([min, max].map((value) => isRefused(field, value))).toEqual([false, false]);
    expect([min - 0.0001, max + 0.0001, NaN].map((value) => isRefused(field, value))).toEqual([true, true, true]);
  });

  test.each(fields)("%s: its ask bounds need no extra tap, and lie inside the refuse bounds", (field) => {
    const { refuse, ask } = chartedRanges[field];
    expect([ask.min, ask.max].map((value) => isUnusual(field, value))).toEqual([false, false]);
    expect(ask.min).toBeGreaterThanOrEqual(refuse.min);
    expect(ask.max).toBeLessThanOrEqual(refuse.max);
  });

  test("what is no number is refused in every field", () => {
    const noNumbers = ["7", "", null, undefined, true, []] as unknown as number[];
    const letThrough = fields.filter((field) => noNumbers.some((value) => !isRefused(field, value)));
    expect(letThrough).toEqual([]);
  });

  test("an exhaled volume of exactly 0 is charted after an extra tap", () => {
    expect(isRefused("exhaledTidalVolumeMl", 0)).toBe(false);
    expect(isUnusual("exhaledTidalVolumeMl", 0)).toBe(true);
    expect(isRefused("exhaledTidalVolumeMl", 9.9)).toBe(true);
    expect(isRefused("tidalVolumeMl", 0)).toBe(true);
  });

  test("V12 a height of 100 to under 120 cm is charted and gives no predicted body weight", () => {
    expect(isRefused("heightCm", 100)).toBe(false);
    expect(isRefused("heightCm", 119.9)).toBe(false);
    expect(pbwHeightCm).toEqual({ min: 120, max: 250, extrapolatedBelow: 152.4 });
  });
});
