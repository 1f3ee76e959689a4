import { describe, expect, test } from "vitest";
import {
  airwayResistanceCmH2OPerLPerS,
  pfRatio,
  predictedBodyWeightKg,
  predictedPh,
  sfRatio,
  slippedUnit,
  tidalVolumePerKg,
  ventilatoryRatio,
} from "@/lib/physiology";

// Common practice: the unit detectors of the plausibility limits.
describe("a slipped unit is named and never converted", () => {
  test.each<[string, () => number]>([
    ["a percentage", () => pfRatio({ pao2MmHg: 80, fio2: 40 })],
    ["a percentage", () => pfRatio({ pao2MmHg: 80, fio2: 100 })],
    ["metres", () => predictedBodyWeightKg({ sex: "male", heightCm: 1.75 })],
    ["litres", () => tidalVolumePerKg({ tidalVolumeMl: 0.42, pbwKg: 70 })],
    ["litres per second", () => airwayResistanceCmH2OPerLPerS({ peakCmH2O: 30, plateauCmH2O: 25, flowLPerMin: 1 })],
    ["millilitres per minute", () => ventilatoryRatio({ minuteVolumeLPerMin: 9000, paco2MmHg: 50, pbwKg: 70 })],
    ["kPa", () => predictedPh({ paco2MmHg: 5.3, hco3MmolPerL: 24 })],
    ["a fraction", () => sfRatio({ spo2Percent: 0.94, fio2: 0.4 })],
    ["a fraction", () => sfRatio({ spo2Percent: 1, fio2: 0.4 })],
  ])("it looks like %s", (unit, calling) => {
    expect(calling).toThrow(RangeError);
    expect(calling).toThrow(`it looks like ${unit}`);
  });

  test("a temperature in Fahrenheit is known for what it is", () => {
    expect(slippedUnit("temperatureC", 98.6)).toBe("degrees Fahrenheit");
    expect(slippedUnit("temperatureC", 38.4)).toBeNull();
  });

  test.each([
    ["heightCm", 70],
    ["heightCm", 0],
    ["heightCm", -1.75],
    ["fio2", 0.2],
    ["fio2", 400],
    ["paco2MmHg", 300],
    ["plateauCmH2O", 0.5],
    ["toString", 1],
  ])("%s %d looks like no other unit", (field, value) => {
    expect(slippedUnit(field, value)).toBeNull();
  });
});
