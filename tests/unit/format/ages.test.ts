import { describe, expect, test } from "vitest";
import { ageText, durationText } from "@/lib/format";

describe("ages and durations", () => {
  test.each([
    [0, "0 h 00"],
    [0.9, "0 h 00"],
    [5, "0 h 05"],
    [20, "0 h 20"],
    [35, "0 h 35"],
    [59.99, "0 h 59"],
    [60, "1 h 00"],
    [130, "2 h 10"],
    [245, "4 h 05"],
    [24 * 60 - 1, "23 h 59"],
    [24 * 60, "1 d 0 h"],
    [51 * 60, "2 d 3 h"],
    [51 * 60 + 59, "2 d 3 h"],
    [-4, "0 h 00"],
  ])("%d min reads '%s'", (minutes, text) => {
    expect(durationText({ minutes })).toBe(text);
  });

  test("an age is counted between moments, whatever their offsets", () => {
    expect(ageText({ since: "2026-12-01T14:35:00+00:00", at: "2026-12-01T16:45:00Z" })).toBe("2 h 10");
    expect(ageText({ since: "2026-12-01T15:35:00+01:00", at: new Date("2026-12-01T16:45:00Z") })).toBe("2 h 10");
    expect(ageText({ since: Date.parse("2026-11-29T13:45:00Z"), at: "2026-12-01T16:45:00Z" })).toBe("2 d 3 h");
  });

  test("an age across a clock change counts the hours that passed", () => {
    expect(ageText({ since: "2026-10-25T01:30:00+02:00", at: "2026-10-25T03:30:00+01:00" })).toBe("3 h 00");
  });

  test("a reading a little ahead of the clock is new", () => {
    expect(ageText({ since: "2026-12-01T16:49:00Z", at: "2026-12-01T16:45:00Z" })).toBe("0 h 00");
  });

  test("what is no moment has no age", () => {
    expect(() => ageText({ since: "yesterday", at: "2026-12-01T16:45:00Z" })).toThrow(RangeError);
    expect(() => durationText({ minutes: NaN })).toThrow(RangeError);
  });
});
