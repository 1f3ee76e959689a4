import { describe, expect, test } from "vitest";
import {
  airwayResistanceCmH2OPerLPerS,
  alveolarPo2MmHg,
  deadSpaceFractionEnghoff,
  drivingPressureCmH2O,
  dynamicComplianceMlPerCmH2O,
  exhaledVolumePerKg,
  expiratoryTimeS,
  intrinsicPeepCmH2O,
  mechanicalPowerVolumeControlJPerMin,
  predictedPaco2MmHg,
  staticComplianceMlPerCmH2O,
} from "@/lib/physiology";

describe("combinations that cannot be", () => {
  test.each([12, 11.999, 12.0000009])(
    "plateau %d on total PEEP 12 gives no driving pressure and no compliance",
    (plateauCmH2O) => {
      const pressures = { plateauCmH2O, totalPeepCmH2O: 12 };
      expect(() => drivingPressureCmH2O(pressures)).toThrow(/plateauCmH2O .* is not above totalPeepCmH2O 12/);
      expect(() => staticComplianceMlPerCmH2O({ tidalVolumeMl: 400, ...pressures })).toThrow(RangeError);
    },
  );

  test("S1 27.1 − 12.1 is 15 within a millionth", () => {
    const driving = drivingPressureCmH2O({ plateauCmH2O: 27.1, totalPeepCmH2O: 12.1 });
    expect(Math.abs(driving - 15)).toBeLessThan(1e-6);
  });

  test("peak at or below total PEEP gives no dynamic compliance", () => {
    const input = { tidalVolumeMl: 400, peakCmH2O: 12, totalPeepCmH2O: 12 };
    expect(() => dynamicComplianceMlPerCmH2O(input)).toThrow(/peakCmH2O 12 is not above totalPeepCmH2O 12/);
  });

  test("peak equal to plateau is a resistance of 0, peak below it is refused", () => {
    const flow = { flowLPerMin: 60, plateauCmH2O: 25 };
    expect(airwayResistanceCmH2OPerLPerS({ ...flow, peakCmH2O: 25 })).toBe(0);
    expect(airwayResistanceCmH2OPerLPerS({ ...flow, peakCmH2O: 24.9999999 })).toBe(0);
    expect(() => airwayResistanceCmH2OPerLPerS({ ...flow, peakCmH2O: 24.9 })).toThrow(RangeError);
  });

  test("power in volume control refuses plateau above peak and plateau on total PEEP", () => {
    const input = { respiratoryRate: 20, tidalVolumeMl: 400, peakCmH2O: 30, plateauCmH2O: 25, totalPeepCmH2O: 10 };
    expect(() => mechanicalPowerVolumeControlJPerMin({ ...input, plateauCmH2O: 31 })).toThrow(/peakCmH2O 30 is below/);
    expect(() => mechanicalPowerVolumeControlJPerMin({ ...input, totalPeepCmH2O: 25 })).toThrow(/is not above/);
  });

  test.each([
    [8, 8, 0],
    [7, 8, 0],
    [6, 8, 0],
    [12, 8, 4],
  ])("total PEEP %d on set PEEP %d is trapped gas %d", (totalPeepCmH2O, peepCmH2O, trapped) => {
    expect(intrinsicPeepCmH2O({ totalPeepCmH2O, peepCmH2O })).toBe(trapped);
  });

  test("total PEEP more than 2 below the set one is refused", () => {
    expect(() => intrinsicPeepCmH2O({ totalPeepCmH2O: 5.99, peepCmH2O: 8 })).toThrow(
      /totalPeepCmH2O 5\.99 .* allowed from 6/,
    );
  });

  test("inspiration as long as the breath leaves no expiration", () => {
    expect(() => expiratoryTimeS({ respiratoryRate: 30, inspiratoryTimeS: 2 })).toThrow(RangeError);
    expect(expiratoryTimeS({ respiratoryRate: 30, inspiratoryTimeS: 1.5 })).toBeCloseTo(0.5, 9);
  });

  test("a volume at or below dead space predicts no PaCO2, before or after", () => {
    const input = {
      paco2MmHg: 60,
      fromTidalVolumeMl: 420,
      fromRespiratoryRate: 20,
      toTidalVolumeMl: 360,
      toRespiratoryRate: 24,
      deadSpaceMl: 150,
    };
    expect(() => predictedPaco2MmHg({ ...input, toTidalVolumeMl: 150 })).toThrow(/toTidalVolumeMl 150 is not above/);
    expect(() => predictedPaco2MmHg({ ...input, fromTidalVolumeMl: 150 })).toThrow(
      /fromTidalVolumeMl 150 is not above/,
    );
    expect(() => predictedPaco2MmHg({ ...input, fromTidalVolumeMl: 0.42 })).toThrow(/fromTidalVolumeMl .* litres/);
  });

  test("mixed expired CO2 up to PaCO2 is a dead space of 0 to 1, above it is refused", () => {
    expect(deadSpaceFractionEnghoff({ paco2MmHg: 40, mixedExpiredCo2MmHg: 40 })).toBe(0);
    expect(deadSpaceFractionEnghoff({ paco2MmHg: 40, mixedExpiredCo2MmHg: 0 })).toBe(1);
    expect(() => deadSpaceFractionEnghoff({ paco2MmHg: 40, mixedExpiredCo2MmHg: 40.1 })).toThrow(RangeError);
  });

  test("PaCO2 that leaves no oxygen in the alveolus is refused", () => {
    const air = { fio2: 0.21, barometricPressureMmHg: 760, respiratoryQuotient: 0.8 };
    expect(() => alveolarPo2MmHg({ ...air, paco2MmHg: 130 })).toThrow(/paco2MmHg 130 leaves no alveolar oxygen/);
    expect(alveolarPo2MmHg({ ...air, paco2MmHg: 100 })).toBeCloseTo(24.73, 2);
  });

  test("alveolar PO2 takes a respiratory quotient of 0.8 where none is given", () => {
    const gas = { fio2: 0.6, paco2MmHg: 45, barometricPressureMmHg: 760 };
    expect(alveolarPo2MmHg(gas)).toBe(alveolarPo2MmHg({ ...gas, respiratoryQuotient: 0.8 }));
  });

  test("V14 an exhaled volume of exactly 0 is 0 mL/kg, above 0 and under 10 mL it is refused", () => {
    expect(exhaledVolumePerKg({ exhaledTidalVolumeMl: 0, pbwKg: 70 })).toBe(0);
    expect(() => exhaledVolumePerKg({ exhaledTidalVolumeMl: 0.42, pbwKg: 70 })).toThrow(/it looks like litres$/);
    expect(() => staticComplianceMlPerCmH2O({ tidalVolumeMl: 0, plateauCmH2O: 25, totalPeepCmH2O: 10 })).toThrow(
      RangeError,
    );
  });
});
