import fc from "fast-check";
import { describe, expect, test } from "vitest";
import * as physiology from "@/lib/physiology";

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const percents = fc.integer({ min: 21, max: 100 });

/** Equal within a billionth of their size. */
function expectClose(a: number, b: number): void {
  expect(Math.abs(a - b)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(a), Math.abs(b)));
}

describe("relations between the functions", () => {
  test("volume per kg times predicted body weight is the volume", () => {
    fc.assert(
      fc.property(within(20, 2000), within(120, 250), (tidalVolumeMl, heightCm) => {
        const pbwKg = physiology.predictedBodyWeightKg({ sex: "female", heightCm });
        expectClose(physiology.tidalVolumePerKg({ tidalVolumeMl, pbwKg }) * pbwKg, tidalVolumeMl);
      }),
    );
  });

  test("static compliance times driving pressure is the volume", () => {
    fc.assert(
      fc.property(within(20, 2000), within(0, 60), within(0.1, 40), (tidalVolumeMl, totalPeepCmH2O, above) => {
        const pressures = { plateauCmH2O: Math.max(2, totalPeepCmH2O + above), totalPeepCmH2O };
        const compliance = physiology.staticComplianceMlPerCmH2O({ tidalVolumeMl, ...pressures });
        expectClose(compliance * physiology.drivingPressureCmH2O(pressures), tidalVolumeMl);
      }),
    );
  });

  test("set PEEP plus trapped gas is total PEEP", () => {
    fc.assert(
      fc.property(within(0, 50), within(0, 10), (peepCmH2O, trapped) => {
        const totalPeepCmH2O = peepCmH2O + trapped;
        expectClose(peepCmH2O + physiology.intrinsicPeepCmH2O({ totalPeepCmH2O, peepCmH2O }), totalPeepCmH2O);
      }),
    );
  });

  test("resistance times flow plus plateau is peak", () => {
    fc.assert(
      fc.property(within(2, 100), within(0, 20), within(5, 200), (plateauCmH2O, above, flowLPerMin) => {
        const peakCmH2O = plateauCmH2O + above;
        const resistance = physiology.airwayResistanceCmH2OPerLPerS({ peakCmH2O, plateauCmH2O, flowLPerMin });
        expectClose((resistance * flowLPerMin) / 60 + plateauCmH2O, peakCmH2O);
      }),
    );
  });

  test("a predicted PaCO2 predicted back is the first PaCO2", () => {
    fc.assert(
      fc.property(within(40, 50), within(300, 500), within(300, 500), within(15, 30), within(15, 30), (...input) => {
        const [paco2MmHg, one, other, slow, fast] = input;
        const deadSpaceMl = 150;
        const there = physiology.predictedPaco2MmHg({
          paco2MmHg,
          fromTidalVolumeMl: one,
          fromRespiratoryRate: slow,
          toTidalVolumeMl: other,
          toRespiratoryRate: fast,
          deadSpaceMl,
        });
        const back = physiology.predictedPaco2MmHg({
          paco2MmHg: there,
          fromTidalVolumeMl: other,
          fromRespiratoryRate: fast,
          toTidalVolumeMl: one,
          toRespiratoryRate: slow,
          deadSpaceMl,
        });
        expectClose(back, paco2MmHg);
      }),
    );
  });

  test("the same minute volume in smaller breaths gives a higher PaCO2", () => {
    const paco2MmHg = physiology.predictedPaco2MmHg({
      paco2MmHg: 40,
      fromTidalVolumeMl: 480,
      fromRespiratoryRate: 18,
      toTidalVolumeMl: 360,
      toRespiratoryRate: 24,
      deadSpaceMl: 150,
    });
    expect(paco2MmHg).toBeGreaterThan(40);
  });

  test("P/F times oxygenation index is 100 times mean airway pressure", () => {
    fc.assert(
      fc.property(within(10, 700), percents, within(0, 80), (pao2MmHg, percent, meanAirwayPressureCmH2O) => {
        const fio2 = percent / 100;
        const index = physiology.oxygenationIndex({ fio2, meanAirwayPressureCmH2O, pao2MmHg });
        expectClose(physiology.pfRatio({ pao2MmHg, fio2 }) * index, 100 * meanAirwayPressureCmH2O);
      }),
    );
  });

  test("arterial PO2 plus the gradient is alveolar PO2", () => {
    fc.assert(
      fc.property(within(10, 700), percents, within(20, 60), (pao2MmHg, percent, paco2MmHg) => {
        const gas = { fio2: percent / 100, paco2MmHg, barometricPressureMmHg: 760, respiratoryQuotient: 0.8 };
        const gradient = physiology.alveolarArterialGradientMmHg({ ...gas, pao2MmHg });
        expectClose(gradient + pao2MmHg, physiology.alveolarPo2MmHg(gas));
      }),
    );
  });

  test("ROX index is S/F over the rate, and minute volume over volume is the rate", () => {
    fc.assert(
      fc.property(within(30, 100), percents, within(1, 150), (spo2Percent, percent, respiratoryRate) => {
        const fio2 = percent / 100;
        const index = physiology.roxIndex({ spo2Percent, fio2, respiratoryRate });
        expectClose(index * respiratoryRate, physiology.sfRatio({ spo2Percent, fio2 }));
        const litres = physiology.minuteVolumeLPerMin({ tidalVolumeMl: 500, respiratoryRate });
        expectClose(litres / 0.5, respiratoryRate);
      }),
    );
  });

  test("at sea level the altitude adjustment changes nothing, and above it P/F reads milder", () => {
    expect(physiology.altitudeAdjustedPf({ pfRatio: 180, barometricPressureMmHg: 760 })).toBe(180);
    expect(physiology.altitudeAdjustedPf({ pfRatio: 180, barometricPressureMmHg: 640 })).toBeGreaterThan(180);
  });
});
