import { describe, expect, it } from "vitest";
import type { SettingsFact } from "@/lib/protocol";
import { dueAt, fact, gas, judge, metric, moment, relaxed, settings, spo2, volumeControl, type Bedside } from "./chart";

const changed = (...changes: SettingsFact[]) => ({ settings: [settings("08:00", volumeControl), ...changes] });
const held = (plateau: number, ...changes: SettingsFact[]): Bedside => ({
  facts: { mechanics: [relaxed("10:00", plateau)], ...changed(...changes) },
});
const word = (name: Parameters<typeof metric>[0], at: string, bedside: Bedside) => metric(name, at, bedside).freshness;

describe("the word of freshness", () => {
  it("F1 F2 pressures are current, due from 4 h, lapsed from 8 h", () => {
    const bedside = held(24);
    expect(word("plateauCmH2O", "13:59", bedside)).toBe("current");
    expect(word("plateauCmH2O", "14:00", bedside)).toBe("due");
    expect(word("plateauCmH2O", "17:59", bedside)).toBe("due");
    expect(word("plateauCmH2O", "18:00", bedside)).toBe("lapsed");
    expect(word("plateauCmH2O", "09:00", bedside)).toBe("missing");
  });

  it("F1 a change outranks age, and missing outranks a change", () => {
    const bedside = held(24, settings("11:00", { peepCmH2O: 12 }));
    expect(word("plateauCmH2O", "10:59", bedside)).toBe("current");
    expect(word("plateauCmH2O", "11:00", bedside)).toBe("changed-since");
    expect(word("plateauCmH2O", "2 10:00", bedside)).toBe("changed-since");
    expect(
      word("staticComplianceMlPerCmH2O", "2 10:00", { ...bedside, targets: { conditions: ["obstructive"] } }),
    ).toBe("missing");
  });

  it("F1 a result from a hold with effort is current, without a value", () => {
    const facts = { mechanics: [fact("10:00", { plateauCmH2O: 24, hold: "effort" as const })] };
    expect(metric("plateauCmH2O", "10:20", { facts })).toMatchObject({ freshness: "current", value: null });
    expect(metric("plateauCmH2O", "10:30", { facts })).toMatchObject({ freshness: "due", value: null });
    expect(metric("plateauCmH2O", "18:00", { facts })).toMatchObject({ freshness: "lapsed", value: null });
  });

  it("F1 lapsed outranks too soon", () => {
    const facts = { observations: [spo2("10:05", 94)], ...changed(settings("10:00", { fio2: 0.6 })) };
    expect(word("spo2Percent", "10:20", { facts })).toBe("too-soon");
    expect(word("spo2Percent", "12:05", { facts })).toBe("lapsed");
  });

  it("F2 SpO2 is due after 1 h, a gas after 12 h or its ordered interval", () => {
    const facts = { observations: [spo2("10:00", 94)], bloodGases: [gas("10:00", { ph: 7.36 })] };
    expect([word("spo2Percent", "10:59", { facts }), word("spo2Percent", "11:00", { facts })]).toEqual([
      "current",
      "due",
    ]);
    expect([word("spo2Percent", "11:59", { facts }), word("spo2Percent", "12:00", { facts })]).toEqual([
      "due",
      "lapsed",
    ]);
    expect([word("ph", "21:59", { facts }), word("ph", "22:00", { facts })]).toEqual(["current", "due"]);
    const ordered = { facts, targets: { gasIntervalH: 6 } };
    expect([word("ph", "15:59", ordered), word("ph", "16:00", ordered)]).toEqual(["current", "due"]);
  });

  it("F2 gases ordered as needed are never due nor lapsed, and a missing one is not asked", () => {
    const facts = { bloodGases: [gas("10:00", { ph: 7.36 })] };
    const asNeeded = { facts, targets: { gasIntervalH: "as-needed" as const } };
    expect(metric("ph", "5 10:00", asNeeded)).toMatchObject({ freshness: "current", dueAt: null, state: "inside" });
    expect(dueAt("gas", judge("5 10:00", asNeeded))).toBeNull();
    const never = judge("5 10:00", { targets: { gasIntervalH: "as-needed" } });
    expect(never.derived.ph.state).toBe("not-asked");
    expect(never.causes.some(({ metric: name }) => name === "ph")).toBe(false);
  });

  it("F2 a unit's own intervals hold", () => {
    const bedside = { ...held(24), unit: { intervals: { pressuresMin: 120 } } };
    expect([word("plateauCmH2O", "12:00", bedside), word("plateauCmH2O", "14:00", bedside)]).toEqual(["due", "lapsed"]);
  });

  it("F4 due alone changes no state; lapsed is unmeasured", () => {
    const bedside = held(29.8);
    expect(metric("plateauCmH2O", "14:00", bedside)).toMatchObject({ state: "edge", value: 29.8, lastState: "edge" });
    expect(metric("plateauCmH2O", "18:00", bedside)).toMatchObject({
      state: "unmeasured",
      value: null,
      lastValue: 29.8,
      lastState: "edge",
      chartedAt: moment("10:00"),
    });
  });

  it("F4 F7 lapsed and last outside keeps its last state and the outside group", () => {
    const answer = judge("18:00", held(34));
    expect(answer.derived.plateauCmH2O).toMatchObject({ state: "unmeasured", lastState: "outside", value: null });
    expect(answer.group).toBe("outside");
  });
});

describe("too soon after a change", () => {
  const soon = (clock: string, value: number): Bedside => ({
    facts: { observations: [spo2("09:00", 94), spo2(clock, value)], ...changed(settings("10:00", { fio2: 0.6 })) },
  });

  it("F5 an SpO2 read under 10 min after a listed change is withheld inside, at the edge and above", () => {
    for (const value of [94, 92, 99]) {
      const derived = metric("spo2Percent", "10:20", soon("10:09", value));
      expect(derived).toMatchObject({ freshness: "too-soon", state: "unmeasured", value: null, lastValue: 94 });
      expect(derived.alternatives).toMatchObject([{ value, note: "too-soon" }]);
    }
    expect(metric("spo2Percent", "10:20", soon("10:10", 94))).toMatchObject({ freshness: "current", state: "inside" });
  });

  it("F5 below the order it is outside at once and keeps its value", () => {
    const answer = judge("10:10", soon("10:02", 90));
    expect(answer.derived.spo2Percent).toMatchObject({
      freshness: "too-soon",
      state: "outside",
      value: 90,
      lastValue: 90,
    });
    expect(answer.group).toBe("outside");
    expect(answer.derived.sfRatio.value).toBeNull();
  });

  it("F5 a gas drawn under 20 min after a listed change: pH and PaCO2 outside on either side, PaO2 below, are judged", () => {
    const after = (body: object, clock = "10:19") =>
      judge("10:40", {
        facts: { bloodGases: [gas(clock, body)], ...changed(settings("10:00", { respiratoryRate: 24, fio2: 0.6 })) },
        targets: { paco2MmHg: { min: 35, max: 45 } },
      }).derived;
    expect(after({ ph: 7.2 }).ph).toMatchObject({ freshness: "too-soon", state: "outside", value: 7.2 });
    expect(after({ ph: 7.5 }).ph.state).toBe("outside");
    expect(after({ ph: 7.36 }).ph).toMatchObject({ state: "unmeasured", value: null });
    expect(after({ paco2MmHg: 50 }).paco2MmHg.state).toBe("outside");
    expect(after({ paco2MmHg: 30 }).paco2MmHg.state).toBe("outside");
    expect(after({ paco2MmHg: 40 }).paco2MmHg.state).toBe("unmeasured");
    expect(after({ pao2MmHg: 55 }).pao2MmHg.state).toBe("outside");
    expect(after({ pao2MmHg: 55 }).pfRatio.value).toBeNull();
    expect(after({ pao2MmHg: 120 }).pao2MmHg).toMatchObject({ state: "unmeasured", value: null });
    expect(after({ ph: 7.36 }, "10:20").ph).toMatchObject({ freshness: "current", state: "inside" });
  });

  it("F5 a PEEP change withholds PaO2, never pH", () => {
    const facts = {
      bloodGases: [gas("10:05", { ph: 7.36, pao2MmHg: 80 })],
      ...changed(settings("10:00", { peepCmH2O: 12 })),
    };
    const { derived } = judge("10:10", { facts });
    expect(derived.ph).toMatchObject({ freshness: "current", value: 7.36 });
    expect(derived.pao2MmHg).toMatchObject({ freshness: "too-soon", value: null });
  });

  it("F9 since skips a withheld reading", () => {
    const facts = {
      observations: [spo2("09:00", 90), spo2("10:05", 95), spo2("10:30", 89)],
      ...changed(settings("10:00", { fio2: 0.6 })),
    };
    expect(metric("spo2Percent", "10:35", { facts }).since).toBe(moment("09:00"));
    expect(metric("spo2Percent", "10:10", { facts })).toMatchObject({ lastState: "outside", lastValue: 90 });
  });
});

describe("when SpO2, gas, check and height are due", () => {
  it("F3 a change that expires SpO2 makes it due 10 min after the first such change", () => {
    const facts = {
      observations: [spo2("10:00", 94)],
      ...changed(settings("10:20", { fio2: 0.6 }), settings("10:25", { peepCmH2O: 12 })),
    };
    expect(metric("spo2Percent", "10:27", { facts }).dueAt).toBe(moment("10:30"));
    expect(dueAt("spo2", judge("10:29", { facts }))).toBeNull();
    expect(dueAt("spo2", judge("10:30", { facts }))).toBe(moment("10:30"));
  });

  it("F3 an SpO2 read too soon is due 10 min after the change", () => {
    const facts = { observations: [spo2("10:05", 94)], ...changed(settings("10:00", { fio2: 0.6 })) };
    expect(metric("spo2Percent", "10:06", { facts }).dueAt).toBe(moment("10:10"));
  });

  it("F2 lists of what is due name SpO2 only when overdue", () => {
    const facts = { observations: [spo2("10:00", 94)] };
    expect(dueAt("spo2", judge("10:59", { facts }))).toBeNull();
    expect(dueAt("spo2", judge("11:00", { facts }))).toBe(moment("11:00"));
    expect(dueAt("hold", judge("08:10", { facts }))).toBe(moment("08:30"));
  });

  const drawn = { bloodGases: [gas("09:00", { ph: 7.36, paco2MmHg: 44, pao2MmHg: 80 })] };
  it("F2 F3 the first gas is due 1 h after intubation, then by its interval; a change alone never makes one due", () => {
    expect(dueAt("gas", judge("08:00"))).toBe(moment("08:30"));
    const facts = { ...drawn, ...changed(settings("10:00", { respiratoryRate: 22, tidalVolumeMl: 400 })) };
    expect(dueAt("gas", judge("10:30", { facts }))).toBe(moment("21:00"));
  });

  it.each([
    ["a prone turn", { positions: [fact("10:00", { position: "prone" as const })] }, "11:00"],
    ["a lateral turn", { positions: [fact("10:00", { position: "left-lateral" as const })] }, "21:00"],
    ["ECMO on", { therapies: [fact("10:00", { therapy: "ecmo" as const, on: true })] }, "11:00"],
    ["a rate lowered by 20 %", changed(settings("10:00", { respiratoryRate: 16 })), "10:30"],
    ["a rate lowered by less", changed(settings("10:00", { respiratoryRate: 16.1 })), "21:00"],
    ["a rate raised", changed(settings("10:00", { respiratoryRate: 30 })), "21:00"],
    ["a volume lowered by 20 %", changed(settings("10:00", { tidalVolumeMl: 336 })), "10:30"],
    ["a volume lowered by less", changed(settings("10:00", { tidalVolumeMl: 337 })), "21:00"],
  ])("F3 after %s the gas is due at its time", (_what, more, due) => {
    expect(dueAt("gas", judge("10:10", { facts: { ...drawn, ...more } }))).toBe(moment(due));
  });

  it("F3 a gas drawn too soon is due 30 min after the change, an expired one last outside too", () => {
    const soon = { bloodGases: [gas("10:10", { ph: 7.36 })], ...changed(settings("10:00", { respiratoryRate: 22 })) };
    expect(dueAt("gas", judge("10:15", { facts: soon }))).toBe(moment("10:30"));
    const outside = { bloodGases: [gas("09:00", { ph: 7.2 })], ...changed(settings("10:00", { respiratoryRate: 22 })) };
    expect(dueAt("gas", judge("10:15", { facts: outside }))).toBe(moment("10:30"));
  });

  it("F3 each is counted from the first such change since the last gas", () => {
    const positions = [fact("08:30", { position: "prone" as const }), fact("10:00", { position: "supine" as const })];
    const turnedAgain = { ...drawn, positions: [...positions, fact("10:30", { position: "prone" as const })] };
    expect(dueAt("gas", judge("10:40", { facts: turnedAgain }))).toBe(moment("11:00"));
  });

  it("F2 settings neither charted nor checked for 4 h are due", () => {
    expect(dueAt("settings-check", judge("08:10"))).toBe(moment("12:00"));
    const facts = { ...changed(settings("09:00", { fio2: 0.6 })), settingsChecks: [fact("10:00", {})] };
    expect(dueAt("settings-check", judge("09:30", { facts }))).toBe(moment("13:00"));
    expect(dueAt("settings-check", judge("10:30", { facts }))).toBe(moment("14:00"));
    expect(judge("14:00", { facts }).due.find(({ what }) => what === "settings-check")?.overdue).toBe(true);
  });

  it("F2 a height is due 1 h after intubation, until height and sex are charted", () => {
    const heights = (body: object) => [fact("07:40", { method: "measured-lying" as const, ...body })];
    expect(dueAt("height", judge("08:00", { facts: { heights: [] } }))).toBe(moment("08:30"));
    expect(dueAt("height", judge("08:00", { facts: { heights: heights({ heightCm: 175 }) } }))).toBe(moment("08:30"));
    expect(dueAt("height", judge("08:00"))).toBeNull();
    const short = heights({ heightCm: 110, sexForPbw: "female" });
    expect(dueAt("height", judge("08:00", { facts: { heights: short } }))).toBeNull();
  });

  it("F2 nothing is due of an episode that ended", () => {
    expect(judge("12:00", { episode: { endedAt: moment("11:00") } }).due).toEqual([]);
    expect(judge("10:59", { episode: { endedAt: moment("11:00") } }).due).not.toEqual([]);
  });

  it("F2 what is due stands with the earliest first", () => {
    const { due } = judge("09:00", { facts: { heights: [] } });
    expect(due.map(({ what, overdue }) => [what, overdue])).toEqual([
      ["height", true],
      ["hold", true],
      ["spo2", true],
      ["gas", true],
      ["settings-check", false],
    ]);
  });
});

describe("a pause", () => {
  const pauses = [{ from: moment("11:00"), until: moment("12:00") }];
  const facts = {
    mechanics: [relaxed("10:00", 24)],
    observations: [spo2("10:30", 94)],
    bloodGases: [gas("10:00", { ph: 7.36 })],
  };

  it("F3 stops all clocks: the patient is away and nothing is due", () => {
    const answer = judge("11:30", { facts, episode: { pauses: [{ from: moment("11:00"), until: null }] } });
    expect(answer.group).toBe("away");
    expect(answer.due).toEqual([]);
    expect(answer.derived.plateauCmH2O.freshness).toBe("current");
    expect(
      judge("2 11:30", { facts, episode: { pauses: [{ from: moment("11:00") }] } }).derived.plateauCmH2O.freshness,
    ).toBe("current");
  });

  it("F3 on return hold, SpO2 and settings check are due, a gas by its interval", () => {
    const answer = judge("12:00", { facts, episode: { pauses } });
    expect(answer.group).not.toBe("away");
    expect(dueAt("hold", answer)).toBe(moment("12:00"));
    expect(dueAt("spo2", answer)).toBe(moment("12:00"));
    expect(dueAt("settings-check", answer)).toBe(moment("12:00"));
    expect(dueAt("gas", answer)).toBe(moment("23:00"));
    expect(answer.derived.plateauCmH2O).toMatchObject({ freshness: "due", state: "inside" });
  });

  it("F3 what was done since the return runs on from there", () => {
    const since = { ...facts, mechanics: [...facts.mechanics, relaxed("12:10", 25)] };
    expect(dueAt("hold", judge("12:20", { facts: since, episode: { pauses } }))).toBe(moment("16:10"));
  });

  it("F3 what falls due as a pause begins is due at its beginning", () => {
    const late = [{ from: moment("22:00"), until: moment("23:00") }];
    expect(metric("ph", "23:30", { facts, episode: { pauses: late } }).dueAt).toBe(moment("22:00"));
  });

  it("F3 an interval leaves the pause out", () => {
    expect(metric("ph", "22:59", { facts, episode: { pauses } }).freshness).toBe("current");
    expect(metric("ph", "23:00", { facts, episode: { pauses } }).freshness).toBe("due");
  });
});

describe("danger after expiry", () => {
  it("F7 keeps last state, group and clock until a fresh value is inside", () => {
    const facts = {
      mechanics: [relaxed("10:00", 31), relaxed("11:00", 33), relaxed("13:00", 29)],
      ...changed(settings("12:00", { tidalVolumeMl: 380 })),
    };
    expect(judge("12:30", { facts }).derived.plateauCmH2O).toMatchObject({
      state: "unmeasured",
      freshness: "changed-since",
      lastState: "outside",
      lastValue: 33,
      since: moment("10:00"),
      changedAt: moment("12:00"),
    });
    expect(judge("12:30", { facts }).group).toBe("outside");
    expect(judge("13:00", { facts }).derived.plateauCmH2O).toMatchObject({ lastState: "inside", since: null });
  });

  it("F7 the last state is judged anew by the order now in force", () => {
    const bedside = held(31, settings("12:00", { peepCmH2O: 12 }));
    expect(metric("plateauCmH2O", "12:30", bedside).lastState).toBe("outside");
    expect(metric("plateauCmH2O", "12:30", { ...bedside, targets: { plateauCmH2O: { max: 32 } } }).lastState).toBe(
      "inside",
    );
  });

  it("F7 comfort overrides it: nothing is judged and nothing is due", () => {
    const answer = judge("12:30", {
      ...held(34, settings("12:00", { peepCmH2O: 12 })),
      targets: { conditions: ["comfort"] },
    });
    expect(answer.group).toBe("not-judged");
    expect(answer.due).toEqual([]);
    expect(answer.findings.every(({ state }) => state === "not-asked")).toBe(true);
    expect(answer.derived.plateauCmH2O.dueAt).toBeNull();
  });

  it("F8 an outside pressure older than a lower rate stays as measured", () => {
    const derived = metric("plateauCmH2O", "12:30", held(34, settings("12:00", { respiratoryRate: 12 })));
    expect(derived).toMatchObject({ state: "outside", freshness: "current", value: 34 });
  });
});
