import { describe, expect, it } from "vitest";
import { bedsideDate, chartedMoment } from "@/lib/chart/charted-moment";

const now = new Date("2026-12-01T12:00:00.000Z");
const intubatedAt = new Date("2026-11-20T08:00:00.000Z");
const at = (instant: string, keeps?: Date) => chartedMoment(instant, { now, intubatedAt, ...(keeps && { keeps }) });
const refusal = expect.objectContaining({
  kind: "validation-failed",
  errors: [expect.objectContaining({ path: "chartedAt" })],
});

function refused(instant: string, keeps?: Date): unknown {
  try {
    return at(instant, keeps);
  } catch (error) {
    return error;
  }
}

describe("chartedMoment", () => {
  it("keeps the offset of the clock it was read from", () => {
    expect(at("2026-12-01T17:15:00+05:45")).toEqual({
      chartedAt: new Date("2026-12-01T11:30:00Z"),
      offsetMinutes: 345,
    });
    expect(at("2026-12-01T08:30:00-03:30").offsetMinutes).toBe(-210);
    expect(at("2026-12-01T11:30:00Z").offsetMinutes).toBe(0);
  });

  it("takes exactly 24 h back and exactly 5 min ahead, which is stored as now", () => {
    expect(at("2026-11-30T12:00:00Z").chartedAt).toEqual(new Date("2026-11-30T12:00:00Z"));
    expect(at("2026-12-01T12:05:00Z").chartedAt).toEqual(now);
    expect(refused("2026-11-30T11:59:59.999Z")).toEqual(refusal);
    expect(refused("2026-12-01T12:05:00.001Z")).toEqual(refusal);
  });

  it("takes the moment of intubation itself, and nothing before", () => {
    const intubated = new Date("2026-12-01T09:00:00Z");
    const moment = (instant: string) => () => chartedMoment(instant, { now, intubatedAt: intubated });
    expect(moment("2026-12-01T09:00:00Z")().chartedAt).toEqual(intubated);
    expect(moment("2026-12-01T08:59:59.999Z")).toThrow(/before intubation/);
  });

  it("lets a replacement keep its original's time however old, but choose no other", () => {
    const original = new Date("2026-11-22T10:00:00Z");
    expect(at("2026-11-22T11:00:00+01:00", original).chartedAt).toEqual(original);
    expect(refused("2026-11-22T10:00:01Z", original)).toEqual(refusal);
  });

  it("refuses a day that there is not", () => {
    expect(refused("2026-11-31T25:00:00Z")).toEqual(refusal);
  });
});

describe("bedsideDate", () => {
  it("is the date on the bedside clock, not that of UTC", () => {
    expect(bedsideDate(at("2026-12-01T00:30:00+05:45"))).toBe("2026-12-01");
    expect(bedsideDate(at("2026-11-30T23:30:00-03:30"))).toBe("2026-11-30");
  });
});
