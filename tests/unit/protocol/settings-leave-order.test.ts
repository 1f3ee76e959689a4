import { describe, expect, it } from "vitest";
import { settingsLeaveOrder, type JudgedSettings } from "@/lib/protocol/settings-leave-order";
import type { Targets } from "@/lib/protocol/targets";

/** Unit default of rules 4 (values of general practice, from memory): VT 4–8 mL/kg, plateau ≤ 30, ΔP ≤ 15. */
const targets: Targets = {
  origin: "default",
  conditions: [],
  vtMlPerKg: { min: 4, max: 8, goal: { min: 6, max: 8 } },
  plateauCmH2O: { max: 30 },
  drivingPressureCmH2O: { max: 15 },
};

/** PBW of a man of 175 cm (ARDS Network 2000: 50 + 0.91 × (175 − 152.4)). */
const pbwKg = 70.566;

const volume = (tidalVolumeMl: number): JudgedSettings => ({ mode: "A/C-VC", tidalVolumeMl, peepCmH2O: 10 });
const pressure = (pressureAbovePeepCmH2O: number, peepCmH2O: number): JudgedSettings => ({
  mode: "A/C-PC",
  pressureAbovePeepCmH2O,
  peepCmH2O,
});
const metrics = (
  before: JudgedSettings | null,
  after: JudgedSettings,
  ordered: Partial<Targets> = {},
  kg: number | null = pbwKg,
) => settingsLeaveOrder({ targets: { ...targets, ...ordered }, pbwKg: kg, before, after }).map(({ metric }) => metric);

describe("settingsLeaveOrder: volume", () => {
  it("a volume that stays inside the order needs no reason", () => {
    expect(metrics(volume(420), volume(480))).toEqual([]);
  });

  it("a volume that leaves the order upward is named with both values", () => {
    const [left] = settingsLeaveOrder({ targets, pbwKg, before: volume(420), after: volume(600) });
    expect(left).toMatchObject({ metric: "vtMlPerKg", limit: { max: 8 } });
    expect(left?.from).toBeCloseTo(5.952, 3);
    expect(left?.to).toBeCloseTo(8.503, 3);
  });

  it("S2 a set volume within half a machine step of the limit counts as on it", () => {
    // 8 × 70.566 = 564.5 mL: 569 is 4.5 mL above, 570 is 5.5 mL above.
    expect(metrics(volume(420), volume(569))).toEqual([]);
    expect(metrics(volume(420), volume(570))).toEqual(["vtMlPerKg"]);
  });

  it("a volume outside that goes further out needs a reason, one that comes back does not", () => {
    expect(metrics(volume(600), volume(640))).toEqual(["vtMlPerKg"]);
    expect(metrics(volume(640), volume(600))).toEqual([]);
    expect(metrics(volume(600), volume(600))).toEqual([]);
  });

  it("a volume that crosses to the other side of the range leaves it again, though less far", () => {
    expect(metrics(volume(200), volume(575))).toEqual(["vtMlPerKg"]);
  });

  it("first settings outside the order need a reason", () => {
    expect(metrics(null, volume(640))).toEqual(["vtMlPerKg"]);
    expect(metrics(null, volume(420))).toEqual([]);
  });

  it("V12 without PBW a volume ordered in mL/kg is not judged, one ordered in mL is", () => {
    expect(metrics(volume(420), volume(900), {}, null)).toEqual([]);
    expect(metrics(volume(300), volume(360), { vtMl: { min: 200, max: 350 } }, null)).toEqual(["vtMl"]);
    expect(metrics(volume(300), volume(350), { vtMl: { min: 200, max: 350 } }, null)).toEqual([]);
  });

  it("a volume that the mode does not set is not judged", () => {
    expect(metrics(volume(420), { ...pressure(12, 8), tidalVolumeMl: 900 })).toEqual([]);
  });
});

describe("settingsLeaveOrder: pressure", () => {
  it("in pressure control PEEP + pressure above PEEP is held against the plateau limit", () => {
    expect(metrics(pressure(14, 16), pressure(14, 17))).toEqual(["plateauCmH2O"]);
    expect(metrics(pressure(14, 14), pressure(14, 16))).toEqual([]);
  });

  it("in pressure control pressure above PEEP is held against the driving pressure limit", () => {
    expect(metrics(pressure(14, 8), pressure(16, 8))).toEqual(["drivingPressureCmH2O"]);
    expect(metrics(pressure(14, 8), pressure(15, 8))).toEqual([]);
  });

  it("S1 a difference under 1e-6 is on the limit, not beyond it", () => {
    expect(metrics(pressure(12, 8), pressure(15.000_000_4, 8))).toEqual([]);
    expect(metrics(pressure(14, 8), pressure(27.1 - 12.1, 8))).toEqual([]);
  });

  it("both pressures are named when both leave", () => {
    expect(metrics(pressure(14, 14), pressure(20, 14))).toEqual(["plateauCmH2O", "drivingPressureCmH2O"]);
  });

  it("a PEEP step in volume control is not judged as a pressure", () => {
    expect(metrics(volume(420), { ...volume(420), peepCmH2O: 40 })).toEqual([]);
  });

  it("without an ordered driving pressure only the plateau limit holds", () => {
    expect(metrics(pressure(14, 8), pressure(20, 8), { drivingPressureCmH2O: null })).toEqual([]);
  });

  it("O3 under the condition comfort nothing is judged", () => {
    expect(metrics(pressure(14, 8), pressure(40, 8), { conditions: ["comfort"] })).toEqual([]);
  });
});
