import { describe, expect, test } from "vitest";
import { lungInjuryScore } from "@/lib/physiology";

// Murray, Am Rev Respir Dis 1988;138:720; floors where the printed whole-number bands leave gaps.
describe("lung injury score", () => {
  test.each([
    [300, 0],
    [299.9, 1],
    [225, 1],
    [224.5, 2],
    [175, 2],
    [174.5, 3],
    [100, 3],
    [99.9, 4],
  ])("a P/F of %d alone scores %d", (pfRatio, score) => {
    expect(lungInjuryScore({ pfRatio })).toEqual({ score, components: 1 });
  });

  test.each([
    [5, 0],
    [5.5, 1],
    [8, 1],
    [11, 2],
    [14, 3],
    [14.5, 4],
    [15, 4],
  ])("PEEP %d alone scores %d", (peepCmH2O, score) => {
    expect(lungInjuryScore({ peepCmH2O })).toEqual({ score, components: 1 });
  });

  test.each([
    [80, 0],
    [79.5, 1],
    [60, 1],
    [40, 2],
    [20, 3],
    [19.5, 4],
  ])("a compliance of %d alone scores %d", (complianceMlPerCmH2O, score) => {
    expect(lungInjuryScore({ complianceMlPerCmH2O })).toEqual({ score, components: 1 });
  });

  test("the mean is of the components that are known", () => {
    expect(lungInjuryScore({ quadrants: 4, pfRatio: 99 })).toEqual({ score: 4, components: 2 });
    expect(lungInjuryScore({ quadrants: 0, pfRatio: 99, peepCmH2O: 5 })).toEqual({ score: 4 / 3, components: 3 });
  });

  test.each([
    [{}, /^no component given/],
    [{ quadrants: 2.5 }, /^quadrants 2\.5 is not whole/],
    [{ quadrants: 5 }, /^quadrants 5 is outside the allowed 0 to 4$/],
    [{ quadrants: NaN }, /^quadrants must be a number/],
    [{ pfRatio: 0 }, /^pfRatio 0 is outside/],
    [{ peepCmH2O: -1 }, /^peepCmH2O -1 is outside/],
    [{ complianceMlPerCmH2O: Infinity }, /^complianceMlPerCmH2O must be a number/],
  ])("refuses %o", (input, message) => {
    expect(() => lungInjuryScore(input)).toThrow(RangeError);
    expect(() => lungInjuryScore(input)).toThrow(message);
  });
});
