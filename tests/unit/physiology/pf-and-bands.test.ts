import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { altitudeAdjustedPf, berlinSeverity, pfRatio, type SeverityBand } from "@/lib/physiology";

const severityOrder: SeverityBand[] = ["severe", "moderate", "mild", "none"];

describe("P/F and its band", () => {
  test.each([
    [56, 0.28, 200],
    [138, 0.69, 200],
    [171, 0.57, 300],
    [58, 0.29, 200],
    [57, 0.57, 100],
    [87, 0.29, 300],
  ])("S1 PaO2 %d at FiO2 %d is a P/F of exactly %d", (pao2MmHg, fio2, ratio) => {
    expect(pfRatio({ pao2MmHg, fio2 })).toBe(ratio);
  });

  test("S1 every whole PaO2 and FiO2 falls into the band that integers give", () => {
    const wholes = fc.tuple(fc.integer({ min: 10, max: 700 }), fc.integer({ min: 21, max: 100 }));
    fc.assert(
      fc.property(wholes, ([pao2MmHg, percent]) => {
        const within = (edge: number) => 100 * pao2MmHg <= edge * percent;
        const expected = within(100) ? "severe" : within(200) ? "moderate" : within(300) ? "mild" : "none";
        const ratio = pfRatio({ pao2MmHg, fio2: percent / 100 });
        expect(berlinSeverity({ pfRatio: ratio, peepCmH2O: 8 })).toBe(expected);
      }),
      { numRuns: 1000 },
    );
  });

  // ARDS Definition Task Force, JAMA 2012;307:2526.
  test.each([
    [100, "severe"],
    [100.0000005, "severe"],
    [100.01, "moderate"],
    [200, "moderate"],
    [200.00000000000003, "moderate"],
    [200.01, "mild"],
    [200.5, "mild"],
    [300, "mild"],
    [300.01, "none"],
  ])("Berlin: a P/F of %d at PEEP 5 is %s", (ratio, band) => {
    expect(berlinSeverity({ pfRatio: ratio, peepCmH2O: 5 })).toBe(band);
  });

  test.each([50, 150, 250, 350])("Berlin: a P/F of %d at PEEP under 5 is not classifiable", (ratio) => {
    expect(berlinSeverity({ pfRatio: ratio, peepCmH2O: 4.99 })).toBe("not classifiable");
  });

  test("Berlin: PEEP of 5 within float noise counts as 5", () => {
    expect(berlinSeverity({ pfRatio: 150, peepCmH2O: 4.9999999 })).toBe("moderate");
  });

  test("a higher P/F is never in a graver band", () => {
    const ratios = fc.double({ min: 10, max: 3334, noNaN: true });
    const rank = (ratio: number) =>
      severityOrder.indexOf(berlinSeverity({ pfRatio: ratio, peepCmH2O: 10 }) as SeverityBand);
    fc.assert(
      fc.property(ratios, ratios, (one, other) => {
        expect(rank(Math.max(one, other))).toBeGreaterThanOrEqual(rank(Math.min(one, other)));
      }),
    );
  });

  test("V13 the altitude adjustment on a band's edge stays on it", () => {
    const adjusted = altitudeAdjustedPf({ pfRatio: 150, barometricPressureMmHg: 570 });
    expect(berlinSeverity({ pfRatio: adjusted, peepCmH2O: 10 })).toBe("moderate");
  });

  test.each([
    [{ pfRatio: NaN, peepCmH2O: 5 }, "pfRatio must be a number"],
    [{ pfRatio: 9, peepCmH2O: 5 }, "pfRatio 9 is outside the allowed 10 to 3334"],
    [{ pfRatio: 150, peepCmH2O: 51 }, "peepCmH2O 51 is outside the allowed 0 to 50"],
    [{ pfRatio: 150, peepCmH2O: NaN }, "peepCmH2O must be a number"],
  ])("Berlin refuses %o", (input, message) => {
    expect(() => berlinSeverity(input)).toThrow(RangeError);
    expect(() => berlinSeverity(input)).toThrow(message);
  });
});
