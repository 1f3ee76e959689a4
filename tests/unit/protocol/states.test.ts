import { describe, expect, it } from "vitest";
import { compareToLimit, stateOf } from "@/lib/protocol";
import { inwardMillilitres } from "@/lib/format";
import { gas, judge, metric, moment, relaxed, settings, spo2, volumeControl, type Bedside } from "./chart";

const withFio2 = (fio2: number, more: object): Bedside => ({
  facts: { settings: [settings("08:00", { ...volumeControl, fio2 })], ...more },
});

describe("comparing with a limit", () => {
  it.each([
    [27.1 - 12.1, 15, 0],
    [15 + 9e-7, 15, 0],
    [15 - 9e-7, 15, 0],
    [15 + 1.1e-6, 15, 1],
    [15 - 1.1e-6, 15, -1],
    [30.04, 30, 1],
  ])("S1 %s against %s is %s", (value, limit, answer) => {
    expect(compareToLimit(value, limit)).toBe(answer);
  });

  it("S1 a value without a limit is not asked, a limit without a value is unmeasured", () => {
    expect(stateOf({ value: 20, limit: null, margin: 0.5 })).toBe("not-asked");
    expect(stateOf({ value: 20, limit: {}, margin: 0.5 })).toBe("not-asked");
    expect(stateOf({ value: null, limit: { max: 30 }, margin: 0.5 })).toBe("unmeasured");
  });

  it.each([
    [30.000002, "outside"],
    [30, "edge"],
    [29.5, "edge"],
    [29.499998, "inside"],
  ])("S2 S6 %s under a limit of 30 with margin 0.5 is %s", (value, state) => {
    expect(stateOf({ value, limit: { max: 30 }, margin: 0.5 })).toBe(state);
  });

  it("S2 without a margin limits are inclusive and nothing has an edge", () => {
    expect(stateOf({ value: 30, limit: { max: 30 } })).toBe("inside");
    expect(stateOf({ value: 20, limit: { min: 20, max: 30 }, margin: null })).toBe("inside");
    expect(stateOf({ value: 30, limit: { max: 30 }, margin: 0 })).toBe("edge");
  });

  it("S2 pH has an edge of 5 % of its range, 0.01 where one-sided", () => {
    const state = (ph: number, range: object) =>
      metric("ph", "10:10", { facts: { bloodGases: [gas("10:00", { ph })] }, targets: { ph: range } }).state;
    expect(state(7.3, { min: 7.3, max: 7.5 })).toBe("edge");
    expect(state(7.31, { min: 7.3, max: 7.5 })).toBe("edge");
    expect(state(7.311, { min: 7.3, max: 7.5 })).toBe("inside");
    expect(state(7.299, { min: 7.3, max: 7.5 })).toBe("outside");
    expect(state(7.21, { min: 7.2 })).toBe("edge");
    expect(state(7.211, { min: 7.2 })).toBe("inside");
  });

  it("S2 driving pressure has an edge of 0.5 cmH2O", () => {
    const state = (plateau: number) =>
      metric("drivingPressureCmH2O", "10:10", { facts: { mechanics: [relaxed("10:00", plateau)] } }).state;
    expect([state(24.4), state(24.5), state(25), state(25.1)]).toEqual(["inside", "edge", "edge", "outside"]);
  });

  it("S2 SpO2, PaO2 and PaCO2 have an edge of 5 % of their range, only the limit itself where one-sided", () => {
    const saturation = (value: number, range?: object) =>
      metric("spo2Percent", "10:10", {
        ...withFio2(0.6, { observations: [spo2("10:00", value)] }),
        ...(range ? { targets: { spo2Percent: range } } : {}),
      }).state;
    // 92–96: 0.2.
    expect([saturation(92), saturation(92.2), saturation(92.3)]).toEqual(["edge", "edge", "inside"]);
    expect([saturation(96), saturation(95.8), saturation(96.1)]).toEqual(["edge", "edge", "outside"]);
    expect([saturation(94, { min: 94 }), saturation(94.1, { min: 94 })]).toEqual(["edge", "inside"]);
    const co2 = (paco2MmHg: number) =>
      metric("paco2MmHg", "10:10", {
        facts: { bloodGases: [gas("10:00", { paco2MmHg })] },
        targets: { paco2MmHg: { min: 35, max: 45 } },
      }).state;
    expect([co2(35.5), co2(35.6), co2(34.9)]).toEqual(["edge", "inside", "outside"]);
  });

  it("S7 ordered limits in millilitres round inward", () => {
    expect(inwardMillilitres({ minMlPerKg: 5, maxMlPerKg: 7, pbwKg: 70.566 })).toEqual({ minMl: 353, maxMl: 493 });
  });
});

describe("upper oxygen limits", () => {
  const saturation = (fio2: number, value: number, conditions: ("obstructive" | "copd")[] = []) =>
    metric("spo2Percent", "10:10", {
      ...withFio2(fio2, { observations: [spo2("10:00", value)] }),
      targets: { conditions },
    });

  it("S5 are judged only above FiO2 0.40; at or below it a value above is inside, with room to lower", () => {
    expect(saturation(0.41, 99)).toMatchObject({ state: "outside", notes: [] });
    expect(saturation(0.4, 99)).toMatchObject({ state: "inside", value: 99, notes: ["room-to-lower-fio2"] });
    expect(saturation(0.4, 96)).toMatchObject({ state: "inside", notes: [] });
    expect(saturation(0.4, 91).state).toBe("outside");
    expect(saturation(0.4, 92).state).toBe("edge");
  });

  it("S5 under the condition COPD they are judged above room air, where there is nothing to lower", () => {
    expect(saturation(0.22, 99, ["copd"]).state).toBe("outside");
    expect(saturation(0.21, 99, ["copd"])).toMatchObject({ state: "inside", notes: [] });
    expect(saturation(0.21, 99)).toMatchObject({ state: "inside", notes: [] });
    expect(saturation(0.35, 99, ["obstructive"]).state).toBe("inside");
  });

  it("S5 PaO2 goes by the FiO2 of its gas, typed first; its last state by the FiO2 now", () => {
    const typed = (fio2: number) =>
      metric("pao2MmHg", "10:10", { facts: { bloodGases: [gas("10:00", { pao2MmHg: 120, fio2 })] } });
    expect(typed(0.6).state).toBe("outside");
    expect(typed(0.4)).toMatchObject({ state: "inside", notes: ["room-to-lower-fio2"] });
    const lowered = (fio2: number) =>
      metric("pao2MmHg", "10:40", {
        facts: {
          settings: [settings("08:00", volumeControl), settings("10:30", { fio2 })],
          bloodGases: [gas("10:00", { pao2MmHg: 120 })],
        },
      });
    expect(lowered(0.45)).toMatchObject({ state: "unmeasured", lastState: "outside" });
    expect(lowered(0.4)).toMatchObject({ state: "unmeasured", lastState: "inside" });
  });
});

describe("the bed's group", () => {
  /** Everything inside at 10:10. */
  const calm = (): NonNullable<Bedside["facts"]> => ({
    mechanics: [relaxed("10:00", 22)],
    observations: [spo2("10:00", 94)],
    bloodGases: [gas("10:00", { ph: 7.38, paco2MmHg: 42, pao2MmHg: 75 })],
  });
  const group = (more: NonNullable<Bedside["facts"]>, bedside: Bedside = {}, at = "10:10") =>
    judge(at, { ...bedside, facts: { ...calm(), ...more } });

  it("S3 is the worst of volume, plateau, driving pressure, oxygen, PaCO2 where ordered, and pH", () => {
    expect(group({}).group).toBe("inside");
    expect(group({ mechanics: [relaxed("10:00", 25)] })).toMatchObject({
      group: "edge",
      causes: [{ metric: "drivingPressureCmH2O", state: "edge" }],
    });
    expect(group({ mechanics: [] }).group).toBe("unmeasured");
    expect(group({ mechanics: [relaxed("10:00", 31)] }).causes.map((cause) => cause.metric)).toEqual([
      "drivingPressureCmH2O",
      "plateauCmH2O",
    ]);
    const acid = { bloodGases: [gas("10:00", { ph: 7.38, paco2MmHg: 60 })] };
    expect(group(acid).group).toBe("inside");
    expect(group(acid, { targets: { paco2MmHg: { min: 35, max: 45 } } }).group).toBe("outside");
  });

  it("S3 a total rate or power outside never decides it", () => {
    const mechanics = [relaxed("10:00", 22, { respiratoryRateTotal: 50, peakCmH2O: 30 })];
    const answer = group({ mechanics }, { targets: { mechanicalPowerJPerMin: { max: 5 } } });
    expect(answer.group).toBe("inside");
    expect(answer.findings.filter(({ state }) => state === "outside").map((one) => one.metric)).toEqual([
      "respiratoryRateTotal",
      "mechanicalPowerJPerMin",
    ]);
  });

  it("S3 a fresh SpO2 counts with a PaO2 at most 1 h older, the worse of the two", () => {
    const oxygen = (saturation: string, drawn: string) =>
      group(
        { observations: [spo2(saturation, 94)], bloodGases: [gas(drawn, { ph: 7.38, pao2MmHg: 50 })] },
        {},
        "11:10",
      );
    expect(oxygen("11:00", "10:00")).toMatchObject({ group: "outside", causes: [{ metric: "pao2MmHg" }] });
    expect(oxygen("11:00", "09:59").group).toBe("inside");
    expect(oxygen("10:15", "11:00").group).toBe("outside");
  });

  it("S3 an expired PaO2 neither moves the group nor escalates", () => {
    const more = {
      settings: [settings("08:00", volumeControl), settings("10:05", { fio2: 0.6 })],
      observations: [spo2("10:20", 94)],
      bloodGases: [gas("10:00", { ph: 7.38, pao2MmHg: 50 })],
    };
    const answer = group(more, {}, "10:30");
    expect(answer.derived.pao2MmHg.lastState).toBe("outside");
    expect(answer.group).toBe("inside");
    expect(answer.findings.find((one) => one.metric === "pao2MmHg")?.escalation).toBeNull();
  });

  it("S3 without a fresh SpO2 a fresh PaO2 under 2 h old and newer stands in its place", () => {
    const drawn = (clock: string) => ({
      observations: [spo2("09:00", 94)],
      bloodGases: [gas(clock, { ph: 7.38, pao2MmHg: 75 })],
    });
    expect(group(drawn("10:00"), {}, "11:59").group).toBe("inside");
    expect(group(drawn("10:00"), {}, "12:00").group).toBe("unmeasured");
    expect(group(drawn("08:30"), {}, "11:00").causes).toEqual([
      { metric: "spo2Percent", state: "unmeasured", lastState: "inside" },
    ]);
  });

  it("S3 else SpO2 last outside keeps the bed outside; a fresh newer PaO2 inside clears it", () => {
    const low = { observations: [spo2("09:00", 88)], bloodGases: [gas("08:30", { ph: 7.38, pao2MmHg: 75 })] };
    expect(group(low, {}, "11:00").causes).toEqual([
      { metric: "spo2Percent", state: "unmeasured", lastState: "outside" },
    ]);
    const cleared = { ...low, bloodGases: [gas("10:30", { ph: 7.38, pao2MmHg: 75 })] };
    expect(group(cleared, {}, "11:00").group).toBe("inside");
  });

  it("S3 a too-soon PaO2 below the order counts at once", () => {
    const more = {
      settings: [settings("08:00", volumeControl), settings("10:05", { fio2: 0.6 })],
      observations: [spo2("10:20", 94)],
      bloodGases: [gas("10:10", { ph: 7.38, pao2MmHg: 50 })],
    };
    expect(group(more, {}, "10:30").group).toBe("outside");
  });

  it("S3 pH without a fresh result moves the group only when due, lapsed or last outside", () => {
    const bloodGases: [] = [];
    expect(group({ bloodGases }, { episode: { intubatedAt: moment("09:30") } }).group).toBe("inside");
    expect(group({ bloodGases }, { episode: { intubatedAt: moment("09:10") } }).causes).toMatchObject([
      { metric: "ph" },
    ]);
    const rateChange = { settings: [settings("08:00", volumeControl), settings("10:05", { respiratoryRate: 22 })] };
    const afterwards = { ...rateChange, mechanics: [relaxed("10:06", 22)] };
    expect(group(afterwards).derived.ph.freshness).toBe("changed-since");
    expect(group(afterwards).group).toBe("inside");
    const acid = { ...afterwards, bloodGases: [gas("10:00", { ph: 7.2 })] };
    expect(group(acid)).toMatchObject({ group: "outside", causes: [{ metric: "ph", lastState: "outside" }] });
  });

  it("S4 a paused patient is away, and one of whom nothing is asked is not judged", () => {
    const pauses = [{ from: moment("10:00"), until: null }];
    expect(group({ mechanics: [relaxed("09:59", 40)] }, { episode: { pauses } }).group).toBe("away");
    const nothing = {
      vtMlPerKg: null,
      plateauCmH2O: null,
      drivingPressureCmH2O: null,
      spo2Percent: null,
      pao2MmHg: null,
      ph: null,
    };
    expect(group({}, { targets: nothing }).group).toBe("not-judged");
  });

  it("S8 under obstructive or COPD trapped gas up to 10 is a check of its own and decides the group", () => {
    const trapped = (total: number, set: "asthma" | "copd" | "unit-default") =>
      judge("10:10", {
        set,
        facts: {
          ...calm(),
          settings: [
            settings("08:00", { ...volumeControl, tidalVolumeMl: 480, peepCmH2O: 5, respiratoryRate: 12, fio2: 0.35 }),
          ],
          mechanics: [relaxed("10:00", 22, { totalPeepCmH2O: total })],
          observations: [spo2("10:00", 91)],
          bloodGases: [gas("10:00", { ph: 7.38 })],
        },
        targets: { spo2Percent: { min: 88, max: 92 } },
      });
    expect(trapped(15, "copd")).toMatchObject({
      group: "inside",
      derived: { intrinsicPeepCmH2O: { state: "inside", value: 10 } },
    });
    expect(trapped(15.1, "asthma")).toMatchObject({ group: "outside", causes: [{ metric: "intrinsicPeepCmH2O" }] });
    expect(trapped(15.1, "unit-default").derived.intrinsicPeepCmH2O).toMatchObject({ state: null, limit: null });
    const never = judge("10:10", {
      set: "asthma",
      facts: { ...calm(), bloodGases: [gas("10:00", { ph: 7.38, pao2MmHg: 75 })] },
    });
    expect(never.derived.intrinsicPeepCmH2O.state).toBe("unmeasured");
    expect(never.group).toBe("unmeasured");
  });

  it("S6 a late entry changes since truthfully, and a void takes it back", () => {
    const readings = [relaxed("10:00", 32), relaxed("12:00", 33)];
    const since = (mechanics: object[]) =>
      metric("plateauCmH2O", "12:10", { facts: { mechanics: mechanics as ReturnType<typeof relaxed>[] } }).since;
    expect(since(readings)).toBe(moment("10:00"));
    const late = { ...relaxed("11:00", 28), recordedAt: moment("12:05") };
    expect(since([readings[0]!, late, readings[1]!])).toBe(moment("12:00"));
    expect(since(readings.slice(1))).toBe(moment("12:00"));
    expect(since([...readings].reverse())).toBe(moment("10:00"));
  });

  it("S6 a late change of settings expires what was measured before it", () => {
    const late = { ...settings("11:00", { peepCmH2O: 12 }), recordedAt: moment("12:05") };
    const facts = { settings: [settings("08:00", volumeControl), late], mechanics: [relaxed("10:00", 24)] };
    expect(metric("plateauCmH2O", "12:10", { facts })).toMatchObject({
      freshness: "changed-since",
      changedAt: moment("11:00"),
    });
    const heldAfter = { ...facts, mechanics: [relaxed("11:30", 24)] };
    expect(metric("drivingPressureCmH2O", "12:10", { facts: heldAfter }).value).toBe(12);
  });
});
