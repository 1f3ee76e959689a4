import { describe, expect, it } from "vitest";
import { fact, metric, pressureControl, relaxed, settings, volumeControl } from "./chart";

const name = "drivingPressureCmH2O";
const on = (mechanics: object[], more: object = {}) => ({
  facts: { mechanics: mechanics as ReturnType<typeof relaxed>[], ...more },
});

describe("driving pressure and compliance", () => {
  it("V4 takes plateau and total PEEP of the same reading", () => {
    const mechanics = [fact("09:00", { totalPeepCmH2O: 10.5 }), relaxed("10:00", 27, { totalPeepCmH2O: 12 })];
    expect(metric(name, "10:10", on(mechanics))).toMatchObject({ value: 15, notes: [], state: "edge" });
  });

  it("V4 takes the set PEEP then in force where no expiratory hold was done, and says so", () => {
    const mechanics = [relaxed("10:00", 24)];
    const derived = metric(name, "10:10", on(mechanics));
    expect(derived).toMatchObject({ value: 14, notes: ["assumes-no-trapped-gas"] });
    expect(derived.inputs.map((input) => [input.name, input.value])).toEqual([
      ["plateauCmH2O", 24],
      ["peepCmH2O", 10],
    ]);
  });

  it("V4 never assumes no trapped gas under the condition obstructive", () => {
    const bedside = { ...on([relaxed("10:00", 24)]), targets: { conditions: ["obstructive"] as const } };
    expect(metric(name, "10:10", bedside)).toMatchObject({
      value: null,
      state: "unmeasured",
      freshness: "missing",
      notes: ["needs-total-peep"],
    });
    expect(metric("plateauCmH2O", "10:10", bedside).value).toBe(24);
  });

  it("V4 never assumes it beside a fresh trapped gas above 0; at 0 it does", () => {
    const trapped = (totalPeepCmH2O: number) => [fact("09:00", { totalPeepCmH2O }), relaxed("10:00", 26)];
    expect(metric(name, "10:10", on(trapped(12)))).toMatchObject({ value: null, notes: ["needs-total-peep"] });
    expect(metric(name, "10:10", on(trapped(10))).value).toBe(16);
    const since = { settings: [settings("08:00", volumeControl), settings("09:30", { peepCmH2O: 12 })] };
    expect(metric(name, "10:10", on(trapped(12), since)).value).toBe(14);
  });

  it("V4 a trapped gas found after the hold takes its assumption away, until total PEEP is measured with one", () => {
    const mechanics = [relaxed("10:00", 26), fact("10:20", { totalPeepCmH2O: 13 })];
    expect(metric(name, "10:10", on(mechanics)).value).toBe(16);
    expect(metric(name, "10:30", on(mechanics)).value).toBeNull();
    const again = [...mechanics, relaxed("10:40", 26, { totalPeepCmH2O: 13 })];
    expect(metric(name, "10:50", on(again)).value).toBe(13);
  });

  it("S1 27.1 over 12.1 is 15, on the limit", () => {
    const derived = metric(name, "10:10", on([relaxed("10:00", 27.1, { totalPeepCmH2O: 12.1 })]));
    expect(derived.state).toBe("edge");
    expect(derived.value).toBeCloseTo(15, 9);
  });

  it("V5 compliance takes the exhaled volume of the same reading, else the set one then in force", () => {
    const compliance = "staticComplianceMlPerCmH2O";
    const changed = { settings: [settings("08:00", volumeControl), settings("10:30", { tidalVolumeMl: 350 })] };
    const alone = metric(compliance, "10:20", on([relaxed("10:00", 25, { totalPeepCmH2O: 10 })], changed));
    // 420 mL over 15 cmH2O: 04-mechanics-001.
    expect(alone.value).toBeCloseTo(28, 9);
    const stale = metric(compliance, "10:40", on([relaxed("10:00", 25, { totalPeepCmH2O: 10 })], changed));
    expect(stale).toMatchObject({ value: null, freshness: "changed-since" });
    expect(stale.lastValue).toBeCloseTo(28, 9);
    const exhaled = [relaxed("10:00", 28, { totalPeepCmH2O: 12, exhaledTidalVolumeMl: 400 })];
    // 400 mL over 16 cmH2O: 04-mechanics-002.
    expect(metric(compliance, "10:20", on(exhaled)).value).toBeCloseTo(25, 9);
  });

  it("V5 compliance in pressure control needs the exhaled volume of the reading", () => {
    const facts = { settings: [settings("08:00", pressureControl)] };
    const compliance = "staticComplianceMlPerCmH2O";
    const mechanics = [fact("09:50", { exhaledTidalVolumeMl: 400 }), relaxed("10:00", 24)];
    expect(metric(compliance, "10:10", on(mechanics, facts))).toMatchObject({ value: null, freshness: "missing" });
    const together = [relaxed("10:00", 24, { exhaledTidalVolumeMl: 400 })];
    expect(metric(compliance, "10:10", on(together, facts)).value).toBeCloseTo(400 / 14, 9);
  });

  it("V5 dynamic compliance is volume over peak minus total PEEP", () => {
    // 450 mL, peak 35, total PEEP 10: 04-mechanics-012.
    const mechanics = [fact("10:00", { peakCmH2O: 35, totalPeepCmH2O: 10, exhaledTidalVolumeMl: 450 })];
    expect(metric("dynamicComplianceMlPerCmH2O", "10:10", on(mechanics)).value).toBeCloseTo(18, 9);
  });

  it("V14 trapped gas is 0 where total PEEP is read below set; what cannot be computed is null and says so", () => {
    const peepEight = { settings: [settings("08:00", { ...volumeControl, peepCmH2O: 8 })] };
    const below = [relaxed("10:00", 20, { totalPeepCmH2O: 7 })];
    expect(metric("intrinsicPeepCmH2O", "10:10", on(below, peepEight)).value).toBe(0);
    const zero = [relaxed("10:00", 24, { exhaledTidalVolumeMl: 0 })];
    expect(metric("staticComplianceMlPerCmH2O", "10:10", on(zero))).toMatchObject({
      value: null,
      freshness: "missing",
      notes: ["assumes-no-trapped-gas", "not-computable"],
    });
    const over = [relaxed("10:00", 26, { peakCmH2O: 24 })];
    expect(metric("airwayResistanceCmH2OPerLPerS", "10:10", on(over))).toMatchObject({
      value: null,
      freshness: "missing",
      notes: ["not-computable"],
    });
    expect(metric("mechanicalPowerJPerMin", "10:10", on(over)).value).toBeNull();
    expect(metric(name, "10:10", on(over)).value).toBe(16);
  });
});
