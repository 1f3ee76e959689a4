import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { inwardMillilitres } from "@/lib/format";

describe("ordered limits in millilitres", () => {
  test("S7 PBW 70.566 at 5 to 7 mL/kg reads 353 to 493", () => {
    const order = { minMlPerKg: 5, maxMlPerKg: 7, pbwKg: 70.566 };
    expect(inwardMillilitres(order)).toEqual({ minMl: 353, maxMl: 493 });
  });

  test("S7 a limit on a whole millilitre stays there, whatever the float noise", () => {
    expect(inwardMillilitres({ minMlPerKg: 4, maxMlPerKg: 8, pbwKg: 70 })).toEqual({ minMl: 280, maxMl: 560 });
    expect(inwardMillilitres({ minMlPerKg: 4.1, maxMlPerKg: 8.2, pbwKg: 30 })).toEqual({ minMl: 123, maxMl: 246 });
  });

  test("S7 an order without a minimum gives none", () => {
    expect(inwardMillilitres({ maxMlPerKg: 4, pbwKg: 70.566 })).toEqual({ maxMl: 282 });
  });

  test("S7 what is read off lies inside the order, and less than a millilitre inside", () => {
    const perKg = fc.double({ min: 3, max: 10, noNaN: true });
    fc.assert(
      fc.property(perKg, perKg, fc.double({ min: 16, max: 139, noNaN: true }), (one, other, pbwKg) => {
        const [minMlPerKg, maxMlPerKg] = [Math.min(one, other), Math.max(one, other)];
        const { minMl = NaN, maxMl } = inwardMillilitres({ minMlPerKg, maxMlPerKg, pbwKg });
        expect(minMl - minMlPerKg * pbwKg).toBeGreaterThanOrEqual(-1e-6);
        expect(minMl - minMlPerKg * pbwKg).toBeLessThan(1);
        expect(maxMlPerKg * pbwKg - maxMl).toBeGreaterThanOrEqual(-1e-6);
        expect(maxMlPerKg * pbwKg - maxMl).toBeLessThan(1);
      }),
    );
  });

  test("an order narrower than a millilitre holds no whole one", () => {
    expect(inwardMillilitres({ minMlPerKg: 6, maxMlPerKg: 6, pbwKg: 70.566 })).toEqual({ minMl: 424, maxMl: 423 });
  });

  test("what is no number is refused", () => {
    expect(() => inwardMillilitres({ maxMlPerKg: 7, pbwKg: NaN })).toThrow(RangeError);
    expect(() => inwardMillilitres({ minMlPerKg: NaN, maxMlPerKg: 7, pbwKg: 70 })).toThrow(RangeError);
  });
});
