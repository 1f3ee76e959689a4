import { describe, expect, test } from "vitest";
import { calendarDate, dayAndDate, localDate, offsetIso, timeOfDay } from "@/lib/format";

const at = "2026-12-01T16:45:30Z";

describe("times in the unit's zone", () => {
  test.each([
    ["Europe/London", "16:45", "Tue 1 Dec", "2026-12-01", "2026-12-01T16:45:30+00:00"],
    ["Europe/Berlin", "17:45", "Tue 1 Dec", "2026-12-01", "2026-12-01T17:45:30+01:00"],
    ["America/New_York", "11:45", "Tue 1 Dec", "2026-12-01", "2026-12-01T11:45:30-05:00"],
    ["America/St_Johns", "13:15", "Tue 1 Dec", "2026-12-01", "2026-12-01T13:15:30-03:30"],
    ["Asia/Kolkata", "22:15", "Tue 1 Dec", "2026-12-01", "2026-12-01T22:15:30+05:30"],
    ["Pacific/Auckland", "05:45", "Wed 2 Dec", "2026-12-02", "2026-12-02T05:45:30+13:00"],
    ["UTC", "16:45", "Tue 1 Dec", "2026-12-01", "2026-12-01T16:45:30+00:00"],
  ])("%s reads %s, %s", (timeZone, time, day, date, iso) => {
    expect(timeOfDay({ at, timeZone })).toBe(time);
    expect(dayAndDate({ at, timeZone })).toBe(day);
    expect(localDate({ at, timeZone })).toBe(date);
    expect(offsetIso({ at, timeZone })).toBe(iso);
  });

  test("midnight reads 00:00 and a moment in any form reads alike", () => {
    const midnight = "2026-12-01T00:00:00Z";
    expect(timeOfDay({ at: midnight, timeZone: "UTC" })).toBe("00:00");
    expect(timeOfDay({ at: new Date(midnight), timeZone: "UTC" })).toBe("00:00");
    expect(timeOfDay({ at: Date.parse(midnight), timeZone: "UTC" })).toBe("00:00");
  });

  test("an offset time names the same moment", () => {
    for (const timeZone of ["Europe/Berlin", "America/St_Johns", "Australia/Lord_Howe", "Asia/Kathmandu"]) {
      expect(Date.parse(offsetIso({ at, timeZone }))).toBe(Date.parse(at));
    }
  });

  test("a birth date is never shifted by a zone", () => {
    expect(calendarDate("1968-03-12")).toBe("12 Mar 1968");
    expect(calendarDate("1968-01-01")).toBe("1 Jan 1968");
    expect(calendarDate("2000-02-29")).toBe("29 Feb 2000");
    expect(calendarDate("1931-12-31")).toBe("31 Dec 1931");
  });

  test.each(["1968-02-30", "1968-3-12", "12 Mar 1968", "", "1968-03-12T00:00:00Z", "1968-13-01"])(
    "'%s' is no date",
    (date) => {
      expect(() => calendarDate(date)).toThrow(RangeError);
    },
  );

  test("an unknown zone and what is no moment are refused", () => {
    expect(() => timeOfDay({ at, timeZone: "Mars/Base" })).toThrow(RangeError);
    expect(() => offsetIso({ at, timeZone: "Mars/Base" })).toThrow(RangeError);
    expect(() => timeOfDay({ at: "soon", timeZone: "UTC" })).toThrow(RangeError);
  });
});
