import { describe, expect, test } from "vitest";
import { isRefused, pfRatio, predictedBodyWeightKg, predictedPh, tidalVolumePerKg } from "@/lib/physiology";

/** Facts of the trade: common practice, no source. */
describe("common practice", () => {
  test("PaO2 150 on pure oxygen is a P/F of 150, on 60 % oxygen 250", () => {
    expect(pfRatio({ pao2MmHg: 150, fio2: 1 })).toBe(150);
    expect(pfRatio({ pao2MmHg: 150, fio2: 0.6 })).toBe(250);
  });

  test("an FiO2 of 10 % is below room air and refused", () => {
    expect(isRefused("fio2", 0.1)).toBe(true);
    expect(() => pfRatio({ pao2MmHg: 80, fio2: 0.1 })).toThrow(RangeError);
  });

  test("50 to 100 mL at 50 kg are the 1 to 2 mL/kg of high-frequency oscillation", () => {
    expect(tidalVolumePerKg({ tidalVolumeMl: 50, pbwKg: 50 })).toBe(1);
    expect(tidalVolumePerKg({ tidalVolumeMl: 100, pbwKg: 50 })).toBe(2);
  });

  test("a conventional 700 to 840 mL at 175 cm is 10 to 12 mL/kg", () => {
    const pbwKg = predictedBodyWeightKg({ sex: "male", heightCm: 175 });
    expect(tidalVolumePerKg({ tidalVolumeMl: 706, pbwKg })).toBeCloseTo(10, 1);
    expect(tidalVolumePerKg({ tidalVolumeMl: 847, pbwKg })).toBeCloseTo(12, 1);
  });

  test("PaCO2 40 with bicarbonate 24 is a normal pH, 7.35 to 7.45", () => {
    const ph = predictedPh({ paco2MmHg: 40, hco3MmolPerL: 24 });
    expect(ph).toBeGreaterThan(7.35);
    expect(ph).toBeLessThan(7.45);
  });
});
