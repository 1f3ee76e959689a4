import { UcumLhcUtils } from "@lhncbc/ucum-lhc";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { cmFromFeetInches, kpaFromMmHg, mmHgFromKpa } from "@/lib/format";

const ucum = UcumLhcUtils.getInstance();
const converted = (from: string, value: number, to: string) => Number(ucum.convertUnitTo(from, value, to).toVal);
const pressures = fc.double({ min: 0, max: 1000, noNaN: true });

// UCUM, as the independent package computes it.
describe("units", () => {
  test("kPa become mmHg as UCUM has it", () => {
    fc.assert(
      fc.property(pressures, (kpa) => {
        expect(Math.abs(mmHgFromKpa(kpa) - converted("kPa", kpa, "mm[Hg]"))).toBeLessThanOrEqual(1e-9 * (1 + kpa));
      }),
    );
  });

  test("mmHg become kPa as UCUM has it", () => {
    fc.assert(
      fc.property(pressures, (mmHg) => {
        expect(Math.abs(kpaFromMmHg(mmHg) - converted("mm[Hg]", mmHg, "kPa"))).toBeLessThanOrEqual(1e-9 * (1 + mmHg));
      }),
    );
  });

  test("a pressure turned to kPa and back is the same pressure", () => {
    fc.assert(
      fc.property(pressures, (mmHg) => {
        expect(Math.abs(mmHgFromKpa(kpaFromMmHg(mmHg)) - mmHg)).toBeLessThanOrEqual(1e-9 * (1 + mmHg));
      }),
    );
  });

  test("inches become cm as UCUM has it", () => {
    for (const inches of [0.5, 58, 60, 70, 84]) {
      expect(cmFromFeetInches({ feet: 0, inches })).toBeCloseTo(converted("[in_i]", inches, "cm"), 9);
    }
  });

  test.each([
    [5, 0, 152.4],
    [5, 10, 177.8],
    [6, 2.5, 189.23],
    [5.5, 0, 167.64],
    [0, 70, 177.8],
  ])("%d ft %d in is %d cm", (feet, inches, cm) => {
    expect(cmFromFeetInches({ feet, inches })).toBeCloseTo(cm, 9);
  });

  test.each([
    [{ feet: -1, inches: 0 }, "feet -1 is below 0"],
    [{ feet: 5, inches: -1 }, "inches -1 is below 0"],
    [{ feet: 5, inches: 12 }, "inches 12 beside 5 feet: allowed 0 to under 12"],
    [{ feet: NaN, inches: 0 }, "feet must be a finite number"],
    [{ feet: 5, inches: Infinity }, "inches must be a finite number"],
  ])("%o is no height", (height, message) => {
    expect(() => cmFromFeetInches(height)).toThrow(RangeError);
    expect(() => cmFromFeetInches(height)).toThrow(message);
  });

  test("what is no number is never converted", () => {
    for (const value of [NaN, Infinity, "8" as unknown as number]) {
      expect(() => mmHgFromKpa(value)).toThrow(RangeError);
      expect(() => kpaFromMmHg(value)).toThrow(RangeError);
    }
  });
});
