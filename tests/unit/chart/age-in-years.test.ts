import { describe, expect, it } from "vitest";
import { ageInYears } from "@/lib/chart/age-in-years";

describe("ageInYears", () => {
  it("counts whole years: a birthday counts from its own day on", () => {
    expect(ageInYears({ birthDate: "1960-06-15", onDate: "2026-06-14" })).toBe(65);
    expect(ageInYears({ birthDate: "1960-06-15", onDate: "2026-06-15" })).toBe(66);
  });

  it("who is born on 29 February is a year older on 1 March, in a leap year on the day itself", () => {
    expect(ageInYears({ birthDate: "2008-02-29", onDate: "2026-02-28" })).toBe(17);
    expect(ageInYears({ birthDate: "2008-02-29", onDate: "2026-03-01" })).toBe(18);
    expect(ageInYears({ birthDate: "2008-02-29", onDate: "2028-02-29" })).toBe(20);
  });

  it("counts no year before birth", () => {
    expect(ageInYears({ birthDate: "2027-01-01", onDate: "2026-12-01" })).toBe(0);
    expect(ageInYears({ birthDate: "2029-01-01", onDate: "2026-12-01" })).toBe(-2);
  });
});
