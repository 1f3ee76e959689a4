import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { instantsOfWallTime, localDate, timeOfDay } from "@/lib/format";

const zones = ["Europe/London", "Europe/Berlin", "America/New_York", "America/St_Johns", "Australia/Lord_Howe", "UTC"];

describe("a time read off the unit's clock", () => {
  test("an ordinary time is one moment", () => {
    const wall = { date: "2026-12-01", time: "14:20", timeZone: "Europe/Berlin" };
    expect(instantsOfWallTime(wall)).toEqual(["2026-12-01T14:20:00+01:00"]);
  });

  // Clock changes of 2026 and 2027 by the IANA time zone database.
  test.each([
    ["2026-10-25", "02:30", "Europe/Berlin", ["2026-10-25T02:30:00+02:00", "2026-10-25T02:30:00+01:00"]],
    ["2026-10-25", "02:00", "Europe/Berlin", ["2026-10-25T02:00:00+02:00", "2026-10-25T02:00:00+01:00"]],
    ["2026-10-25", "03:00", "Europe/Berlin", ["2026-10-25T03:00:00+01:00"]],
    ["2026-10-25", "01:59", "Europe/Berlin", ["2026-10-25T01:59:00+02:00"]],
    ["2026-11-01", "01:30", "America/New_York", ["2026-11-01T01:30:00-04:00", "2026-11-01T01:30:00-05:00"]],
    ["2026-04-05", "01:45", "Australia/Lord_Howe", ["2026-04-05T01:45:00+11:00", "2026-04-05T01:45:00+10:30"]],
  ])("%s %s in %s is every moment at which the clock showed it, earliest first", (date, time, timeZone, instants) => {
    expect(instantsOfWallTime({ date, time, timeZone })).toEqual(instants);
  });

  test.each([
    ["2027-03-28", "02:00", "Europe/Berlin"],
    ["2027-03-28", "02:59", "Europe/Berlin"],
    ["2027-03-14", "02:30", "America/New_York"],
    ["2026-10-04", "02:15", "Australia/Lord_Howe"],
  ])("%s %s in %s is skipped by the clock change: no moment", (date, time, timeZone) => {
    expect(instantsOfWallTime({ date, time, timeZone })).toEqual([]);
  });

  test("the times around the skipped hour are one moment each", () => {
    const at = (time: string) => instantsOfWallTime({ date: "2027-03-28", time, timeZone: "Europe/Berlin" });
    expect(at("01:59")).toEqual(["2027-03-28T01:59:00+01:00"]);
    expect(at("03:00")).toEqual(["2027-03-28T03:00:00+02:00"]);
  });

  test("each moment reads back as the same clock, and every moment's clock leads back to it", () => {
    const moments = fc.integer({ min: Date.UTC(2026, 0, 1) / 60_000, max: Date.UTC(2028, 0, 1) / 60_000 });
    fc.assert(
      fc.property(moments, fc.constantFrom(...zones), (minute, timeZone) => {
        const at = minute * 60_000;
        const wall = { date: localDate({ at, timeZone }), time: timeOfDay({ at, timeZone }) };
        const instants = instantsOfWallTime({ ...wall, timeZone });
        expect(instants.map((each) => Date.parse(each))).toContain(at);
        expect(instants.map((each) => timeOfDay({ at: each, timeZone }))).toEqual(instants.map(() => wall.time));
      }),
      { numRuns: 500 },
    );
  });

  test.each([
    [{ date: "2026-02-30", time: "14:20", timeZone: "UTC" }],
    [{ date: "2026-12-01", time: "24:00", timeZone: "UTC" }],
    [{ date: "2026-12-01", time: "9:05", timeZone: "UTC" }],
    [{ date: "2026-12-01", time: "", timeZone: "UTC" }],
    [{ date: "2026-12-01", time: "14:20", timeZone: "Mars/Base" }],
  ])("%o is refused", (wall) => {
    expect(() => instantsOfWallTime(wall)).toThrow(RangeError);
  });
});
