import { describe, expect, it } from "vitest";
import type { MechanicsFact, TherapyFact } from "@/lib/protocol";
import { fact, metric, pressureControl, relaxed, settings, spo2, volumeControl, type Bedside } from "./chart";

const inMode = (begins: object, mechanics: object[], more: object = {}): Bedside => ({
  facts: { settings: [settings("08:00", begins)], mechanics: mechanics as MechanicsFact[], ...more },
});

describe("minute volume and total rate", () => {
  const name = "minuteVolumeLPerMin";
  it("V7 is measured where it was measured", () => {
    const reading = fact("10:00", { minuteVolumeLPerMin: 9, exhaledTidalVolumeMl: 420, respiratoryRateTotal: 20 });
    expect(metric(name, "10:10", inMode(volumeControl, [reading]))).toMatchObject({ value: 9, notes: [] });
  });

  it("V7 else it is exhaled × total rate of one reading", () => {
    const one = fact("10:00", { exhaledTidalVolumeMl: 360, respiratoryRateTotal: 30 });
    // 360 mL × 30: 06-ventilation-002.
    expect(metric(name, "10:10", inMode(pressureControl, [one]))).toMatchObject({
      value: 10.8,
      notes: ["exhaled-times-rate"],
    });
    const two = [fact("10:00", { exhaledTidalVolumeMl: 360 }), fact("10:05", { respiratoryRateTotal: 30 })];
    expect(metric(name, "10:10", inMode(pressureControl, two))).toMatchObject({ value: null, freshness: "missing" });
  });

  it("V7 else set × set, only where the total rate is unknown or at most one above the set one", () => {
    const total = (respiratoryRateTotal: number) => inMode(volumeControl, [fact("10:00", { respiratoryRateTotal })]);
    // 420 mL × 20: 06-ventilation-001.
    expect(metric(name, "10:10", inMode(volumeControl, []))).toMatchObject({ value: 8.4, notes: ["set-times-set"] });
    expect(metric(name, "10:10", total(21)).value).toBe(8.4);
    expect(metric(name, "10:10", total(21.5)).value).toBeNull();
    expect(metric(name, "10:10", total(22)).value).toBeNull();
  });

  it("V7 a total rate that lapsed or that a change expired is unknown", () => {
    const bedside = inMode(volumeControl, [fact("10:00", { respiratoryRateTotal: 30 })]);
    expect(metric(name, "17:59", bedside).value).toBeNull();
    expect(metric(name, "18:00", bedside).value).toBe(8.4);
    const charted = [settings("08:00", volumeControl), settings("10:30", { tidalVolumeMl: 400 })];
    const changed = inMode(volumeControl, [fact("10:00", { respiratoryRateTotal: 30 })], { settings: charted });
    expect(metric(name, "10:29", changed).value).toBeNull();
    expect(metric(name, "10:30", changed).value).toBe(8);
  });

  it("V7 a measured one that a change expired gives way", () => {
    const charted = [settings("08:00", volumeControl), settings("10:30", { respiratoryRate: 24 })];
    const bedside = inMode(volumeControl, [fact("10:00", { minuteVolumeLPerMin: 9 })], { settings: charted });
    expect(metric(name, "10:40", bedside)).toMatchObject({ value: (420 * 24) / 1000, notes: ["set-times-set"] });
  });

  it("V7 total rate is the newer of mechanics and observations", () => {
    const observations = [{ ...spo2("10:05", 94), respiratoryRateTotal: 28 }];
    const mechanics = [fact("10:00", { respiratoryRateTotal: 24 })];
    expect(metric("respiratoryRateTotal", "10:10", inMode(volumeControl, mechanics, { observations })).value).toBe(28);
    const newer = [...mechanics, fact("10:08", { respiratoryRateTotal: 22 })];
    expect(metric("respiratoryRateTotal", "10:10", inMode(volumeControl, newer, { observations })).value).toBe(22);
  });

  it("S2 a total rate has no edge: its limit is inclusive", () => {
    const total = (respiratoryRateTotal: number) => inMode(volumeControl, [fact("10:00", { respiratoryRateTotal })]);
    expect(metric("respiratoryRateTotal", "10:10", total(35)).state).toBe("inside");
    expect(metric("respiratoryRateTotal", "10:10", total(35.5)).state).toBe("outside");
  });
});

describe("resistance, power and rapid shallow breathing", () => {
  const held = (more: object = {}) => relaxed("10:00", 25, { peakCmH2O: 35, ...more });

  it("V10 resistance is asked in volume control with constant flow only", () => {
    const name = "airwayResistanceCmH2OPerLPerS";
    // (35 − 25) over 1 L/s: 04-mechanics-007.
    expect(metric(name, "10:10", inMode(volumeControl, [held()])).value).toBeCloseTo(10, 9);
    expect(metric(name, "10:10", inMode({ ...volumeControl, flowPattern: "square" }, [held()])).value).toBeCloseTo(
      10,
      9,
    );
    const decelerating = { ...volumeControl, flowPattern: "decelerating" };
    expect(metric(name, "10:10", inMode(decelerating, [held()]))).toMatchObject({ value: null, state: "not-asked" });
    expect(metric(name, "10:10", inMode(pressureControl, [held()])).state).toBe("not-asked");
    const { flowLPerMin: _flow, ...untold } = volumeControl;
    expect(metric(name, "10:10", inMode(untold, [held()]))).toMatchObject({ value: null, freshness: "missing" });
  });

  it("V10 power takes the volume form in A/C-VC, with the total rate", () => {
    const name = "mechanicalPowerJPerMin";
    const pressures = { peakCmH2O: 30, totalPeepCmH2O: 10, exhaledTidalVolumeMl: 450 };
    const reading = relaxed("10:00", 23, { ...pressures, respiratoryRateTotal: 20 });
    // rate 20, 0.45 L, peak 30, ΔP 13: 05-mech-power-001.
    expect(metric(name, "10:10", inMode(volumeControl, [reading])).value).toBeCloseTo(20.727, 3);
    const untold = relaxed("10:00", 23, pressures);
    expect(metric(name, "10:10", inMode(volumeControl, [untold])).notes).toEqual(["set-rate"]);
    const observed = { observations: [{ ...spo2("09:55", 94), respiratoryRateTotal: 30 }] };
    expect(metric(name, "10:10", inMode(volumeControl, [untold], observed)).value).toBeCloseTo(31.0905, 3);
  });

  it("V10 power takes the pressure form in A/C-PC, and in A/C-vtPC with peak minus PEEP", () => {
    const name = "mechanicalPowerJPerMin";
    const reading = fact("10:00", { exhaledTidalVolumeMl: 450, respiratoryRateTotal: 20, peakCmH2O: 25 });
    const begins = { ...pressureControl, pressureAbovePeepCmH2O: 15 };
    // rate 20, 0.45 L, 15 above 10: 05-mech-power-012.
    expect(metric(name, "10:10", inMode(begins, [reading])).value).toBeCloseTo(22.05, 3);
    const vtpc = { ...volumeControl, mode: "A/C-vtPC" };
    expect(metric(name, "10:10", inMode(vtpc, [reading])).value).toBeCloseTo(22.05, 3);
    const { peakCmH2O: _peak, ...noPeak } = reading;
    expect(metric(name, "10:10", inMode(vtpc, [noPeak])).value).toBeNull();
  });

  it.each([
    ["SIMV-VC-PS", { ...volumeControl, mode: "SIMV-VC-PS", pressureSupportCmH2O: 8 }],
    ["CSV-PS", { mode: "CSV-PS", pressureSupportCmH2O: 10, peepCmH2O: 5, fio2: 0.4 }],
    ["APRV", { mode: "APRV", pHighCmH2O: 26, pLowCmH2O: 0, tHighS: 5, tLowS: 0.5, fio2: 0.5 }],
  ])("V10 power is not asked in %s", (_mode, begins) => {
    expect(metric("mechanicalPowerJPerMin", "10:10", inMode(begins, [held()])).state).toBe("not-asked");
  });

  it("V10 a power ceiling is inclusive", () => {
    const reading = fact("10:00", { exhaledTidalVolumeMl: 450, respiratoryRateTotal: 20 });
    const bedside = inMode({ ...pressureControl, pressureAbovePeepCmH2O: 15 }, [reading]);
    const state = (max: number) =>
      metric("mechanicalPowerJPerMin", "10:10", { ...bedside, targets: { mechanicalPowerJPerMin: { max } } }).state;
    expect(state(22.05)).toBe("inside");
    expect(state(22.04)).toBe("outside");
  });

  it("V10 RSBI is worked out only in an unsupported spontaneous breathing trial", () => {
    const name = "rapidShallowBreathingIndex";
    const support = { mode: "CSV-PS", pressureSupportCmH2O: 5, peepCmH2O: 5, fio2: 0.4 };
    const breaths = [fact("10:05", { exhaledTidalVolumeMl: 250, respiratoryRateTotal: 30 })];
    const trial = (body: object): { therapies: TherapyFact[] } => ({
      therapies: [fact("10:00", { therapy: "sbt" as const, ...body })],
    });
    expect(metric(name, "10:10", inMode(support, breaths)).state).toBe("not-asked");
    expect(metric(name, "10:10", inMode(support, breaths, trial({ unsupported: false }))).value).toBeNull();
    // rate 30 over 0.25 L.
    expect(metric(name, "10:10", inMode(support, breaths, trial({ unsupported: true }))).value).toBe(120);
    expect(metric(name, "12:01", inMode(support, breaths, trial({ unsupported: true }))).state).toBe("not-asked");
  });
});
