import { describe, expect, it } from "vitest";
import type { MechanicsFact, PositionFact, SettingsFact } from "@/lib/protocol";
import {
  dueAt,
  fact,
  judge,
  metric,
  moment,
  pressureControl,
  relaxed,
  settings,
  volumeControl,
  type Bedside,
} from "./chart";

const name = "plateauCmH2O";
const hold = (clock: string, plateauCmH2O: number, quality?: string, more: object = {}) =>
  fact(clock, { plateauCmH2O, ...(quality ? { hold: quality } : {}), ...more });
const notPossible = (clock: string) => fact(clock, { hold: "not-possible", holdReason: "leak" });

function measured(mechanics: object[], begins: object = volumeControl, changes: object[] = []): Bedside {
  const charted = [settings("08:00", begins), ...changes] as SettingsFact[];
  return { facts: { settings: charted, mechanics: mechanics as MechanicsFact[] } };
}

describe("plateau and how the hold went", () => {
  it.each([
    ["relaxed", 29.4, "inside"],
    ["relaxed", 29.5, "edge"],
    ["relaxed", 30, "edge"],
    ["relaxed", 30.1, "outside"],
    ["effort", 30.1, "outside"],
    ["effort", 30, "unmeasured"],
    ["unsure", 30.1, "outside"],
    ["unsure", 29, "unmeasured"],
    [undefined, 30.1, "outside"],
    [undefined, 24, "unmeasured"],
  ])("V8 a hold %s at %s reads %s", (quality, plateau, state) => {
    const derived = metric(name, "10:10", measured([hold("10:00", plateau, quality)]));
    expect(derived.state).toBe(state);
    expect(derived.freshness).toBe("current");
    expect(derived.value).toBe(state === "unmeasured" ? null : plateau);
    expect(derived.notes).toEqual(quality === "relaxed" ? [] : ["patient-effort"]);
  });

  it("V8 F9 a withheld hold stands among the alternatives, and the last judged one keeps its word", () => {
    const derived = metric(name, "10:10", measured([relaxed("09:00", 32), hold("10:00", 27, "effort")]));
    expect(derived).toMatchObject({ value: null, lastValue: 32, lastState: "outside", since: moment("09:00") });
    expect(derived.alternatives).toEqual([
      { value: 27, note: "patient-effort", chartedAt: moment("10:00"), entryId: expect.any(String) },
    ]);
  });

  it("V8 driving pressure, compliance and power are unmeasured while a hold with effort is the newest", () => {
    const more = { peakCmH2O: 40, exhaledTidalVolumeMl: 420, respiratoryRateTotal: 20 };
    const { derived } = judge("10:10", measured([relaxed("09:00", 24, more), hold("10:00", 33, "effort", more)]));
    expect(derived.plateauCmH2O).toMatchObject({ value: 33, state: "outside" });
    for (const one of ["drivingPressureCmH2O", "staticComplianceMlPerCmH2O", "mechanicalPowerJPerMin"] as const) {
      expect(derived[one]).toMatchObject({ value: null, freshness: "current", notes: ["patient-effort"] });
      expect(derived[one].lastValue).not.toBeNull();
    }
    expect(derived.drivingPressureCmH2O).toMatchObject({ lastValue: 14, lastState: "inside", state: "unmeasured" });
  });

  it("V8 power by pressure is unmeasured while a hold with effort is the newest", () => {
    const more = { exhaledTidalVolumeMl: 420, respiratoryRateTotal: 20 };
    const readings = [hold("09:00", 24, "effort"), fact("10:00", more)];
    expect(metric("mechanicalPowerJPerMin", "10:10", measured(readings, pressureControl))).toMatchObject({
      value: null,
      notes: ["patient-effort"],
    });
  });

  it("V8 a relaxed or impossible hold sets the clock to 4 h, the others to 30 min", () => {
    expect(dueAt("hold", judge("10:10", measured([relaxed("10:00", 24)])))).toBe(moment("14:00"));
    expect(dueAt("hold", judge("10:10", measured([notPossible("10:00")])))).toBe(moment("14:00"));
    for (const quality of ["effort", "unsure", undefined]) {
      expect(dueAt("hold", judge("10:10", measured([hold("10:00", 24, quality)])))).toBe(moment("10:30"));
    }
  });

  it("V8 an impossible hold charts no plateau, and leaves the older one to age", () => {
    const derived = metric(name, "10:10", measured([relaxed("09:00", 24), notPossible("10:00")]));
    expect(derived).toMatchObject({ value: 24, freshness: "current", dueAt: moment("14:00") });
    expect(metric(name, "10:10", measured([notPossible("10:00")]))).toMatchObject({
      value: null,
      freshness: "missing",
    });
  });

  it("V8 total PEEP alone is no hold", () => {
    expect(dueAt("hold", judge("09:40", measured([fact("09:30", { totalPeepCmH2O: 11 })])))).toBe(moment("08:30"));
  });

  it("V9 pressure control ending at zero flow counts as a relaxed hold", () => {
    const zero = (more: object = {}) => [fact("10:00", { endInspiratoryFlowZero: true, ...more })];
    const derived = metric(name, "10:10", measured(zero(), pressureControl));
    expect(derived).toMatchObject({ value: 24, state: "inside", notes: ["zero-flow"], dueAt: moment("14:00") });
    expect(derived.inputs.map((input) => input.name)).toEqual(["peepCmH2O", "pressureAbovePeepCmH2O"]);
    const driving = metric("drivingPressureCmH2O", "10:10", measured(zero(), pressureControl));
    expect([driving.value, driving.inputs.map(({ name: input }) => input)]).toEqual([
      14,
      ["pressureAbovePeepCmH2O", "peepCmH2O"],
    ]);
    const trapped = metric("drivingPressureCmH2O", "10:10", measured(zero({ totalPeepCmH2O: 12 }), pressureControl));
    expect([trapped.value, trapped.inputs.map(({ name: input }) => input)]).toEqual([
      12,
      ["pressureAbovePeepCmH2O", "peepCmH2O", "totalPeepCmH2O"],
    ]);
    expect(metric(name, "10:10", measured(zero({ hold: "relaxed" }), pressureControl)).value).toBe(24);
    expect(metric(name, "10:10", measured(zero({ hold: "effort" }), pressureControl)).value).toBeNull();
    expect(metric(name, "10:10", measured(zero({ plateauCmH2O: 22, hold: "relaxed" }), pressureControl)).value).toBe(
      22,
    );
    expect(metric(name, "10:10", measured(zero(), volumeControl)).freshness).toBe("missing");
    expect(
      metric(name, "10:10", measured([fact("10:00", { endInspiratoryFlowZero: false })], pressureControl)).value,
    ).toBeNull();
  });

  const aprv = { mode: "APRV", pHighCmH2O: 31, pLowCmH2O: 0, tHighS: 5, tLowS: 0.5, fio2: 0.5 };
  it("V9 in APRV P-high is held against the plateau's limit, driving pressure is not asked", () => {
    const { derived, due } = judge("20:00", measured([], aprv));
    expect(derived.plateauCmH2O).toMatchObject({
      value: 31,
      state: "outside",
      freshness: "current",
      notes: ["p-high"],
    });
    expect(derived.drivingPressureCmH2O.state).toBe("not-asked");
    expect(due.some(({ what }) => what === "hold")).toBe(false);
    const changed = measured([relaxed("09:00", 24)], aprv, [settings("10:00", { pHighCmH2O: 28 })]);
    expect(metric(name, "10:10", changed)).toMatchObject({ value: 28, state: "inside", lastState: "inside" });
  });

  const support = { mode: "CSV-PS", pressureSupportCmH2O: 10, peepCmH2O: 5, fio2: 0.4 };
  it("V9 CSV-PS and CPAP ask a plateau only after a relaxed hold since the mode began", () => {
    for (const begins of [support, { mode: "CPAP", peepCmH2O: 5, fio2: 0.4 }]) {
      expect(metric(name, "10:10", measured([], begins))).toMatchObject({ state: "not-asked", dueAt: null });
      expect(metric(name, "10:10", measured([hold("10:00", 33, "effort")], begins)).state).toBe("not-asked");
      expect(metric(name, "10:10", measured([relaxed("10:00", 33)], begins)).state).toBe("outside");
    }
    const before = measured([relaxed("09:00", 33)], volumeControl, [settings("10:00", support)]);
    expect(metric(name, "10:10", before)).toMatchObject({ state: "not-asked", value: null, lastValue: 33 });
  });

  it("V9 F7 not asked suspends what was last outside, and it returns with a mode that asks", () => {
    const hfov = { mode: "HFOV", meanAirwayPressureCmH2O: 24, frequencyHz: 6, amplitudeCmH2O: 70, fio2: 0.6 };
    const changes = [settings("10:00", hfov), settings("14:00", volumeControl)];
    const bedside = measured([relaxed("09:00", 34)], volumeControl, changes);
    const during = judge("11:00", bedside);
    expect(during.derived[name]).toMatchObject({ state: "not-asked", lastValue: 34, lastState: "outside" });
    expect(during.causes.some((cause) => cause.metric === name)).toBe(false);
    const after = judge("14:10", bedside);
    expect(after.derived[name]).toMatchObject({ state: "unmeasured", lastState: "outside" });
    expect(after.group).toBe("outside");
    expect(dueAt("hold", after)).toBe(moment("14:30"));
  });

  it("V9 HFOV asks no volume, plateau, driving pressure, compliance, power or rate", () => {
    const hfov = { mode: "HFOV", meanAirwayPressureCmH2O: 24, frequencyHz: 6, amplitudeCmH2O: 70, fio2: 0.6 };
    const { derived } = judge("10:10", measured([relaxed("10:00", 24, { respiratoryRateTotal: 40 })], hfov));
    const notAsked = ["vtMlPerKg", "plateauCmH2O", "drivingPressureCmH2O", "staticComplianceMlPerCmH2O"] as const;
    const alsoNot = ["dynamicComplianceMlPerCmH2O", "mechanicalPowerJPerMin", "respiratoryRateTotal"] as const;
    for (const one of [...notAsked, ...alsoNot]) expect(derived[one].state, one).toBe("not-asked");
    expect(derived.spo2Percent.state).toBe("unmeasured");
  });

  it("V9 NIV and HFNO are judged on SpO2, gases and total rate alone", () => {
    const niv = { mode: "NIV", pressureSupportCmH2O: 8, peepCmH2O: 6, fio2: 0.5 };
    const { derived } = judge("10:10", measured([relaxed("10:00", 40, { respiratoryRateTotal: 40 })], niv));
    expect(derived.respiratoryRateTotal.state).toBe("outside");
    expect(derived.plateauCmH2O.state).toBe("not-asked");
    expect(derived.vtMlPerKg.state).toBe("not-asked");
  });
});

describe("when the next hold is due", () => {
  it("F3 30 min after the first settings of a mode that asks a plateau", () => {
    expect(dueAt("hold", judge("08:05", measured([])))).toBe(moment("08:30"));
    const support = { mode: "CSV-PS", pressureSupportCmH2O: 10, peepCmH2O: 5, fio2: 0.4 };
    const later = measured([], support, [settings("11:00", volumeControl)]);
    expect(dueAt("hold", judge("10:00", later))).toBeNull();
    expect(dueAt("hold", judge("11:05", later))).toBe(moment("11:30"));
  });

  it("F3 30 min after the first listed change since the last hold", () => {
    const changes = [settings("11:00", { peepCmH2O: 12 }), settings("11:20", { tidalVolumeMl: 400 })];
    const bedside = measured([relaxed("10:00", 24)], volumeControl, changes);
    expect(dueAt("hold", judge("11:25", bedside))).toBe(moment("11:30"));
    const overdue = (at: string) => judge(at, bedside).due.find(({ what }) => what === "hold")?.overdue;
    expect([overdue("11:29"), overdue("11:30")]).toEqual([false, true]);
  });

  it("F3 a change not listed for plateau moves no hold", () => {
    const bedside = measured([relaxed("10:00", 24)], volumeControl, [settings("11:00", { fio2: 0.6 })]);
    expect(dueAt("hold", judge("11:10", bedside))).toBe(moment("14:00"));
  });

  it("F3 a hold that was overdue before a change stays overdue", () => {
    const bedside = measured([relaxed("10:00", 24)], volumeControl, [settings("15:00", { peepCmH2O: 12 })]);
    expect(dueAt("hold", judge("15:10", bedside))).toBe(moment("14:00"));
    const soon = measured([relaxed("10:00", 24)], volumeControl, [settings("13:50", { peepCmH2O: 12 })]);
    expect(dueAt("hold", judge("13:55", soon))).toBe(moment("14:20"));
  });

  it("F3 a turn makes a hold due", () => {
    const positions: PositionFact[] = [fact("11:00", { position: "prone" as const })];
    const facts = { mechanics: [relaxed("10:00", 24)], positions };
    expect(dueAt("hold", judge("11:10", { facts }))).toBe(moment("11:30"));
  });

  it("F3 the first hold of a patient never held is due from the first settings, whatever changed since", () => {
    const bedside = measured([], volumeControl, [settings("08:20", { peepCmH2O: 12 })]);
    expect(dueAt("hold", judge("08:25", bedside))).toBe(moment("08:30"));
  });
});
