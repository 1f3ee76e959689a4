import { describe, expect, it } from "vitest";
import { expiratoryPartsOf, inspiratoryTimeFromIe } from "@/components/record/inspiratory-time-from-ie";

describe("I:E and inspiratory time (common practice: one breath lasts 60 / rate)", () => {
  it("at 20 a minute, 1:2 is 1 s of inspiration, and back", () => {
    expect(inspiratoryTimeFromIe({ respiratoryRate: 20, expiratoryParts: 2 })).toBe(1);
    expect(expiratoryPartsOf({ respiratoryRate: 20, inspiratoryTimeS: 1 })).toBe(2);
  });

  it("is charted to the hundredth of a second", () => {
    expect(inspiratoryTimeFromIe({ respiratoryRate: 24, expiratoryParts: 2 })).toBe(0.83);
  });
});
