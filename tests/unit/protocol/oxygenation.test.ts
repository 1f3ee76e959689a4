import { describe, expect, it } from "vitest";
import type { BloodGasFact, MechanicsFact, TherapyFact } from "@/lib/protocol";
import { fact, gas, metric, moment, settings, spo2, volumeControl, type Bedside } from "./chart";

const drawn = (gases: BloodGasFact[], more: object = {}): Bedside => ({ facts: { bloodGases: gases, ...more } });
const changed = (...changes: object[]) => ({ settings: [settings("08:00", volumeControl), ...changes] });

describe("oxygenation ratios", () => {
  it("V5 P/F takes the FiO2 in force when the blood was drawn, typed first", () => {
    const later = changed(settings("09:00", { fio2: 0.6 }), settings("10:10", { fio2: 0.8 }));
    const derived = metric("pfRatio", "10:20", drawn([gas("10:00", { pao2MmHg: 61 })], later));
    expect(derived.lastValue).toBeCloseTo(61 / 0.6, 9);
    expect(derived).toMatchObject({ value: null, freshness: "changed-since", band: "moderate" });
    const typed = metric("pfRatio", "10:05", drawn([gas("10:00", { pao2MmHg: 56, fio2: 0.28 })], later));
    // 56 over 0.28 sits on a band's edge: 03-pf-ards-008.
    expect(typed).toMatchObject({ value: 200, band: "moderate" });
    expect(typed.inputs.map((input) => [input.name, input.value])).toContainEqual(["fio2", 0.28]);
  });

  it("V5 a change of FiO2 at the moment of the draw counts as before it", () => {
    const at = changed(settings("10:00", { fio2: 0.8 }));
    const soon = metric("pfRatio", "10:30", drawn([gas("10:00", { pao2MmHg: 80 })], at));
    expect(soon.alternatives).toMatchObject([{ value: 100, note: "too-soon" }]);
    const derived = metric("pfRatio", "10:30", drawn([gas("10:25", { pao2MmHg: 80 })], at));
    expect(derived.value).toBe(100);
  });

  it("V5 S/F takes the FiO2 in force at the reading", () => {
    const derived = metric("sfRatio", "10:10", { facts: { observations: [spo2("10:00", 94)] } });
    expect(derived.value).toBe(188);
    const high = metric("sfRatio", "10:10", { facts: { observations: [spo2("10:00", 98)] } });
    expect(high.notes).toEqual(["spo2-above-97"]);
    const at97 = metric("sfRatio", "10:10", { facts: { observations: [spo2("10:00", 97)] } });
    expect(at97.notes).toEqual([]);
  });

  const mean = (clock: string): MechanicsFact[] => [fact(clock, { meanAirwayPressureCmH2O: 15 })];
  it("V5 the indices take a mean airway pressure within 1 h, no listed change between", () => {
    const gases = [gas("10:00", { pao2MmHg: 75, fio2: 0.6 })];
    const index = (mechanics: MechanicsFact[], more: object = {}) =>
      metric("oxygenationIndex", "11:00", drawn(gases, { mechanics, ...more })).value;
    // FiO2 0.6, mean 15, PaO2 75: 07-oxygenation-013.
    expect(index(mean("09:00"))).toBeCloseTo(12, 9);
    expect(index(mean("08:59"))).toBeNull();
    expect(index(mean("11:00"))).toBeCloseTo(12, 9);
    expect(index(mean("09:00"), changed(settings("09:30", { respiratoryRate: 24 })))).toBeNull();
    const observations = [spo2("10:00", 96)];
    const saturation = metric("oxygenSaturationIndex", "10:10", { facts: { observations, mechanics: mean("09:30") } });
    expect(saturation.value).toBeCloseTo((50 * 15) / 96, 9);
  });

  it("V5 in HFOV the indices take the set mean airway pressure", () => {
    const hfov = { mode: "HFOV", meanAirwayPressureCmH2O: 25, frequencyHz: 6, amplitudeCmH2O: 70, fio2: 1 };
    const facts = { settings: [settings("08:00", hfov)], bloodGases: [gas("10:00", { pao2MmHg: 50 })] };
    // FiO2 1, mean 25, PaO2 50: 07-oxygenation-014.
    expect(metric("oxygenationIndex", "10:10", { facts }).value).toBe(50);
  });

  it("V5 the gradient takes one gas and the unit's barometric pressure", () => {
    const gases = [gas("10:00", { pao2MmHg: 80, paco2MmHg: 45, fio2: 0.6 })];
    // 07-oxygenation-003.
    expect(metric("alveolarArterialGradientMmHg", "10:10", drawn(gases)).value).toBeCloseTo(291.55, 2);
  });

  it("V5 the ventilatory ratio takes the newest minute volume before the gas, else the first after, within 1 h", () => {
    const gases = [gas("10:00", { paco2MmHg: 50 })];
    const minute = (clock: string, minuteVolumeLPerMin: number): MechanicsFact => fact(clock, { minuteVolumeLPerMin });
    const ratio = (...mechanics: MechanicsFact[]) => metric("ventilatoryRatio", "11:30", drawn(gases, { mechanics }));
    const by = (litres: number) => (litres * 1000 * 50) / (70.566 * 100 * 37.5);
    expect(ratio(minute("09:10", 8), minute("09:50", 9), minute("10:05", 10)).value).toBeCloseTo(by(9), 9);
    expect(ratio(minute("10:05", 10)).value).toBeCloseTo(by(10), 9);
    expect(ratio(minute("09:00", 9)).value).toBeCloseTo(by(9), 9);
    const setOnly = ratio(minute("08:59", 9));
    expect(setOnly.value).toBeCloseTo(by(8.4), 9);
    expect(setOnly.notes).toEqual(["set-times-set"]);
  });

  it("V11 on ECMO the band and the ventilatory ratio are not asked", () => {
    const therapies: TherapyFact[] = [fact("08:30", { therapy: "ecmo" as const, on: true })];
    const bedside = drawn([gas("10:00", { pao2MmHg: 70, paco2MmHg: 40, ph: 7.4 })], { therapies });
    expect(metric("pfRatio", "10:10", bedside)).toMatchObject({ value: 140 });
    expect(metric("pfRatio", "10:10", bedside).band).toBeUndefined();
    expect(metric("ventilatoryRatio", "10:10", bedside)).toMatchObject({ value: null, state: "not-asked" });
    const off = { therapies: [...therapies, fact("09:00", { therapy: "ecmo" as const, on: false })] };
    expect(metric("pfRatio", "10:10", { facts: { ...bedside.facts, ...off } }).band).toBe("moderate");
  });

  it.each([
    [675, "moderate", []],
    [674, "mild", ["adjusted-for-altitude"]],
    [570, "mild", ["adjusted-for-altitude"]],
  ])("V13 at %s mmHg a raw 180 reads %s", (barometricPressureMmHg, band, notes) => {
    const bedside = { ...drawn([gas("10:00", { pao2MmHg: 90 })]), unit: { barometricPressureMmHg } };
    expect(metric("pfRatio", "10:10", bedside)).toMatchObject({ value: 180, band, notes });
  });

  it("V13 PEEP below 5 is not classifiable; in APRV and HFOV it is not comparable; HFNO has no band", () => {
    const at = (begins: object) =>
      metric("pfRatio", "10:10", {
        facts: { settings: [settings("08:00", begins)], bloodGases: [gas("10:00", { pao2MmHg: 90 })] },
      });
    expect(at({ ...volumeControl, peepCmH2O: 4 }).band).toBe("not classifiable");
    expect(at({ ...volumeControl, peepCmH2O: 5 }).band).toBe("moderate");
    const aprv = at({ mode: "APRV", pHighCmH2O: 26, pLowCmH2O: 0, tHighS: 5, tLowS: 0.5, fio2: 0.5 });
    expect([aprv.band, aprv.notes]).toEqual([undefined, ["peep-not-comparable"]]);
    const hfno = at({ mode: "HFNO", flowLPerMin: 50, fio2: 0.5 });
    expect([hfno.value, hfno.band, hfno.notes]).toEqual([180, undefined, []]);
    const niv = at({ mode: "NIV", pressureSupportCmH2O: 8, peepCmH2O: 6, fio2: 0.5 });
    expect([niv.band, niv.notes]).toEqual(["mild", ["non-invasive-mild-only"]]);
  });

  it("V13 the band is ARDS's only once an assessment says so, and the last band stays readable", () => {
    const assessed = { ardsAssessments: [fact("09:00", { ards: true })] };
    const bedside = drawn([gas("10:00", { pao2MmHg: 65 })], {
      ...assessed,
      ...changed(settings("11:00", { fio2: 0.6 })),
    });
    expect(metric("pfRatio", "10:10", bedside).notes).toEqual(["ards-assessed"]);
    expect(metric("pfRatio", "11:10", bedside)).toMatchObject({ value: null, lastValue: 130, band: "moderate" });
    expect(metric("pfRatio", "10:10", drawn([gas("10:00", { pao2MmHg: 65 })])).notes).toEqual([]);
  });

  it("V5 a venous gas feeds neither oxygen nor CO2", () => {
    const venous = [{ ...gas("10:00", { pao2MmHg: 40, paco2MmHg: 50, ph: 7.3 }), specimen: "venous" as const }];
    for (const name of ["pao2MmHg", "paco2MmHg", "ph", "pfRatio"] as const) {
      expect(metric(name, "10:10", drawn(venous))).toMatchObject({ value: null, freshness: "missing" });
    }
    expect(metric("ph", "10:10", drawn(venous)).dueAt).toBe(moment("08:30"));
  });
});
