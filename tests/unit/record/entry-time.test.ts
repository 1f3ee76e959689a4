import { describe, expect, it } from "vitest";
import { latenessOf, momentsOfTime, timeRefusal } from "@/components/record/entry-time";

const timeZone = "Europe/Berlin";
const now = Date.parse("2026-12-01T14:20:00+01:00");

describe("the time of an entry", () => {
  it("is today's, or yesterday's where the clock has not come there yet today", () => {
    expect(momentsOfTime({ time: "13:05", now, timeZone })).toEqual(["2026-12-01T13:05:00+01:00"]);
    expect(momentsOfTime({ time: "23:10", now, timeZone })).toEqual(["2026-11-30T23:10:00+01:00"]);
  });

  it("may be up to 5 min ahead of the server", () => {
    expect(momentsOfTime({ time: "14:25", now, timeZone })).toEqual(["2026-12-01T14:25:00+01:00"]);
    expect(momentsOfTime({ time: "14:26", now, timeZone })).toEqual(["2026-11-30T14:26:00+01:00"]);
  });

  it("is asked where the clock change of 25 October 2026 repeats the hour", () => {
    const morning = Date.parse("2026-10-25T08:00:00+01:00");
    expect(momentsOfTime({ time: "02:30", now: morning, timeZone })).toEqual([
      "2026-10-25T02:30:00+02:00",
      "2026-10-25T02:30:00+01:00",
    ]);
  });

  it("does not exist in the hour that the clock change of 29 March 2026 skips", () => {
    const morning = Date.parse("2026-03-29T08:00:00+02:00");
    expect(momentsOfTime({ time: "02:30", now: morning, timeZone })).toEqual([]);
  });

  it("is refused more than 24 h back, more than 5 min ahead, and before intubation", () => {
    const refusal = (at: string) => timeRefusal({ at, now, intubatedAt: "2026-12-01T09:00:00+01:00" });
    expect(refusal("2026-11-30T14:19:00+01:00")).toContain("24 h back");
    expect(refusal("2026-12-01T14:26:00+01:00")).toContain("5 min ahead");
    expect(refusal("2026-12-01T08:59:00+01:00")).toContain("before intubation");
    expect(refusal("2026-12-01T09:00:00+01:00")).toBeNull();
  });

  it("is called late from an hour on", () => {
    expect(latenessOf("2026-12-01T13:20:00+01:00", now)).toBe("late by 1 h 00");
    expect(latenessOf("2026-12-01T13:21:00+01:00", now)).toBeNull();
  });
});
