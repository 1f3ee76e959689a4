import { describe, expect, it } from "vitest";
import type { DerivedName, Evaluation, Facts } from "@/lib/protocol";
import { compareBeds } from "@/lib/protocol";
import { fact, finding, gas, judge, moment, relaxed, settings, spo2, volumeControl } from "./chart";

const answered = (clock: string, metric: DerivedName, value: number | null, until: string) =>
  fact(clock, { metric, value, until: moment(until), note: "volume down after the round" });

const outsideAt32 = { mechanics: [relaxed("10:00", 32, { totalPeepCmH2O: 20 })] };
const acknowledged = (at: string, facts: Facts, until = "13:00", value: number | null = 32) => {
  const acknowledgements = [answered("10:30", "plateauCmH2O", value, until)];
  return finding("plateauCmH2O", judge(at, { facts: { acknowledgements, ...facts } })).acknowledgement;
};

describe("findings", () => {
  it("A1 one for each metric that is ordered, with state, value, limit, distance, freshness and since", () => {
    const answer = judge("10:10", { facts: outsideAt32 });
    expect(answer.findings.map(({ metric }) => metric)).toEqual([
      "vtMlPerKg",
      "plateauCmH2O",
      "drivingPressureCmH2O",
      "spo2Percent",
      "pao2MmHg",
      "ph",
      "respiratoryRateTotal",
    ]);
    expect(finding("plateauCmH2O", answer)).toMatchObject({
      state: "outside",
      value: 32,
      lastValue: 32,
      limit: { max: 30, origin: "order" },
      distance: 2,
      freshness: "current",
      since: moment("10:00"),
      acknowledgement: null,
    });
    expect(finding("spo2Percent", answer)).toMatchObject({ state: "unmeasured", value: null, distance: null });
  });

  it("A1 the limit says whether it was ordered or is the default", () => {
    const answer = judge("10:10", { targets: { origin: "default" } });
    expect(finding("plateauCmH2O", answer).limit).toEqual({ max: 30, origin: "default" });
    expect(answer.nextSteps).toEqual([]);
  });

  it("A1 nothing ordered makes no finding", () => {
    const answer = judge("10:10", { targets: { drivingPressureCmH2O: null } });
    expect(answer.findings.some(({ metric }) => metric === "drivingPressureCmH2O")).toBe(false);
    expect(answer.derived.drivingPressureCmH2O).toMatchObject({ state: null, limit: null });
  });
});

describe("acknowledgements", () => {
  it("A2 answers its metric, with who, until when and what they will do", () => {
    expect(acknowledged("10:40", outsideAt32)).toEqual({
      by: { id: "7", name: "R. Therapist" },
      until: moment("13:00"),
      note: "volume down after the round",
    });
    expect(acknowledged("10:29", outsideAt32)).toBeNull();
  });

  it("A2 returns when its time ends", () => {
    expect(acknowledged("12:59", outsideAt32)).not.toBeNull();
    expect(acknowledged("13:00", outsideAt32)).toBeNull();
  });

  it("A2 keeps quiet 4 h at most, 1 h for SpO2 or PaO2 below and pH", () => {
    expect(acknowledged("14:29", outsideAt32, "23:00")).toMatchObject({ until: moment("14:30") });
    expect(acknowledged("14:30", outsideAt32, "23:00")).toBeNull();
    const quiet = (metric: DerivedName, value: number, facts: Facts) =>
      finding(
        metric,
        judge("10:40", { facts: { ...facts, acknowledgements: [answered("10:30", metric, value, "23:00")] } }),
      ).acknowledgement?.until;
    expect(quiet("ph", 7.2, { bloodGases: [gas("10:00", { ph: 7.2 })] })).toBe(moment("11:30"));
    expect(quiet("spo2Percent", 88, { observations: [spo2("10:00", 88)] })).toBe(moment("11:30"));
    const high = { settings: [settings("08:00", { ...volumeControl, fio2: 0.7 })], observations: [spo2("10:00", 99)] };
    expect(quiet("spo2Percent", 99, high)).toBe(moment("14:30"));
  });

  it("A2 returns one step further out, not before", () => {
    const further = (plateau: number) => ({
      mechanics: [...outsideAt32.mechanics, relaxed("11:00", plateau, { totalPeepCmH2O: 20 })],
    });
    expect(acknowledged("11:10", further(33.9))).not.toBeNull();
    expect(acknowledged("11:10", further(34))).toBeNull();
    const cameBack = { mechanics: [...further(34).mechanics, relaxed("11:30", 32, { totalPeepCmH2O: 20 })] };
    expect(acknowledged("11:40", cameBack)).toBeNull();
  });

  it.each([
    [
      "spo2Percent",
      { observations: [spo2("10:00", 90), spo2("11:00", 88.1)] },
      { observations: [spo2("10:00", 90), spo2("11:00", 88)] },
    ],
    [
      "ph",
      { bloodGases: [gas("10:00", { ph: 7.28 }), gas("11:00", { ph: 7.251 })] },
      { bloodGases: [gas("10:00", { ph: 7.28 }), gas("11:00", { ph: 7.25 })] },
    ],
    [
      "vtMlPerKg",
      {
        settings: [
          settings("08:00", { ...volumeControl, tidalVolumeMl: 600 }),
          settings("11:00", { tidalVolumeMl: 635 }),
        ],
      },
      {
        settings: [
          settings("08:00", { ...volumeControl, tidalVolumeMl: 600 }),
          settings("11:00", { tidalVolumeMl: 636 }),
        ],
      },
    ],
  ] as [DerivedName, Facts, Facts][])("A2 the step of %s is its own", (metric, within, beyond) => {
    const value = metric === "vtMlPerKg" ? 600 / 70.566 : metric === "ph" ? 7.28 : 90;
    const acknowledgements = [answered("10:30", metric, value, "11:25")];
    const answer = (facts: Facts) =>
      finding(metric, judge("11:10", { facts: { ...facts, acknowledgements } })).acknowledgement;
    expect(answer(within)).not.toBeNull();
    expect(answer(beyond)).toBeNull();
  });

  it("A2 returns with a second metric; SpO2 and PaO2 are one", () => {
    const second = { ...outsideAt32, bloodGases: [gas("11:00", { ph: 7.2 })] };
    expect(acknowledged("11:10", second)).toBeNull();
    const before = { ...outsideAt32, bloodGases: [gas("10:20", { ph: 7.2 })] };
    expect(acknowledged("11:10", before)).not.toBeNull();
    const oxygen = {
      observations: [spo2("10:00", 88)],
      bloodGases: [gas("11:00", { pao2MmHg: 50 })],
      acknowledgements: [answered("10:30", "spo2Percent", 88, "11:25")],
    };
    expect(finding("spo2Percent", judge("10:55", { facts: oxygen })).acknowledgement).not.toBeNull();
    expect(finding("spo2Percent", judge("11:10", { facts: oxygen })).acknowledgement).not.toBeNull();
  });

  it("A2 a late entry leaves it in force", () => {
    const late = { ...gas("11:00", { ph: 7.2 }), recordedAt: moment("12:01") };
    expect(acknowledged("12:10", { ...outsideAt32, bloodGases: [late] })).not.toBeNull();
    const inTime = { ...late, recordedAt: moment("12:00") };
    expect(acknowledged("12:10", { ...outsideAt32, bloodGases: [inTime] })).toBeNull();
  });

  it("A2 F7 answers a finding that is no longer measured", () => {
    const expired = {
      ...outsideAt32,
      settings: [settings("08:00", volumeControl), settings("10:20", { peepCmH2O: 12 })],
    };
    expect(acknowledged("10:40", expired)).not.toBeNull();
  });

  it("A2 a finding inside carries none", () => {
    expect(
      acknowledged("11:10", { mechanics: [...outsideAt32.mechanics, relaxed("11:00", 24, { totalPeepCmH2O: 20 })] }),
    ).toBeNull();
  });
});

describe("what is sent", () => {
  const escalation = (metric: DerivedName, answer: Evaluation) => finding(metric, answer).escalation ?? null;

  it("A3 counts 30 min from when the record held what put it outside", () => {
    const late = { ...relaxed("10:00", 32), recordedAt: moment("10:20") };
    const facts = { mechanics: [late, relaxed("11:00", 33)] };
    expect(escalation("plateauCmH2O", judge("11:10", { facts }))).toEqual({
      from: moment("10:20"),
      at: moment("10:50"),
    });
  });

  it("A3 counts from a later order, and anew from the return of a pause", () => {
    const ordered = judge("10:40", { facts: outsideAt32, targets: { recordedAt: moment("10:30") } });
    expect(escalation("plateauCmH2O", ordered)?.from).toBe(moment("10:30"));
    const pauses = [{ from: moment("10:10"), until: moment("10:50") }];
    const back = judge("11:00", { facts: outsideAt32, episode: { pauses } });
    expect(escalation("plateauCmH2O", back)).toEqual({ from: moment("10:50"), at: moment("11:20") });
  });

  it("A3 a finding that returns counts anew from its return", () => {
    const acknowledgements = [answered("10:30", "plateauCmH2O", 32, "11:00")];
    const ended = judge("11:10", { facts: { ...outsideAt32, acknowledgements } });
    expect(escalation("plateauCmH2O", ended)).toEqual({ from: moment("11:00"), at: moment("11:30") });
    const further = { ...relaxed("10:40", 34, { totalPeepCmH2O: 20 }), recordedAt: moment("10:42") };
    const worse = judge("10:50", { facts: { mechanics: [...outsideAt32.mechanics, further], acknowledgements } });
    expect(escalation("plateauCmH2O", worse)).toEqual({ from: moment("10:42"), at: moment("11:12") });
  });

  it("A3 nothing is sent of a patient who is away", () => {
    const pauses = [{ from: moment("10:05"), until: null }];
    expect(escalation("plateauCmH2O", judge("11:00", { facts: outsideAt32, episode: { pauses } }))).toBeNull();
  });

  it("A3 an answered finding is not sent", () => {
    const acknowledgements = [answered("10:30", "plateauCmH2O", 32, "13:00")];
    expect(escalation("plateauCmH2O", judge("10:40", { facts: { ...outsideAt32, acknowledgements } }))).toBeNull();
  });

  it("A3 sends volume and pressures above, oxygen below and pH outside, nothing else", () => {
    const facts = {
      settings: [settings("08:00", { ...volumeControl, tidalVolumeMl: 620, fio2: 0.6 })],
      mechanics: [relaxed("10:00", 32, { respiratoryRateTotal: 50 })],
      observations: [spo2("10:00", 88)],
      bloodGases: [gas("10:00", { ph: 7.5, pao2MmHg: 50, paco2MmHg: 60 })],
    };
    const answer = judge("10:10", { facts, targets: { paco2MmHg: { max: 45 } } });
    const sent = answer.findings.filter((one) => one.escalation).map(({ metric }) => metric);
    expect(sent).toEqual(["vtMlPerKg", "plateauCmH2O", "drivingPressureCmH2O", "spo2Percent", "pao2MmHg", "ph"]);
    const notSent = {
      settings: [settings("08:00", { ...volumeControl, tidalVolumeMl: 250, fio2: 0.6 })],
      observations: [spo2("10:00", 99)],
    };
    expect(judge("10:10", { facts: notSent }).findings.some((one) => one.escalation)).toBe(false);
  });

  it("A3 volume is not sent in CSV-PS and CPAP", () => {
    const mechanics = [fact("10:00", { exhaledTidalVolumeMl: 700 })];
    for (const begins of [
      { mode: "CSV-PS", pressureSupportCmH2O: 10, peepCmH2O: 5, fio2: 0.4 },
      { mode: "CPAP", peepCmH2O: 5, fio2: 0.4 },
    ]) {
      const answer = judge("10:10", { facts: { settings: [settings("08:00", begins)], mechanics } });
      expect(finding("vtMlPerKg", answer)).toMatchObject({ state: "outside", escalation: null });
    }
  });

  it("A3 trapped gas above 10 is sent under obstructive", () => {
    const facts = { mechanics: [relaxed("10:00", 28, { totalPeepCmH2O: 20.1 })] };
    expect(escalation("intrinsicPeepCmH2O", judge("10:10", { set: "asthma", facts }))).not.toBeNull();
  });
});

describe("which bed needs a look first", () => {
  const bed = (facts: Facts) => judge("11:10", { facts });
  const calm: Facts = {
    mechanics: [relaxed("11:00", 22)],
    observations: [spo2("11:00", 94)],
    bloodGases: [gas("10:00", { ph: 7.38 })],
  };
  const acknowledgements = [answered("11:05", "plateauCmH2O", 31, "13:00")];
  const plateau = (value: number) => relaxed("11:00", value, { totalPeepCmH2O: 18 });

  it("S4 outside, not measured, at the edge, inside; in a group unanswered first, then the furthest out", () => {
    const ordered = [
      bed({ ...calm, mechanics: [plateau(33)] }),
      bed({ ...calm, mechanics: [plateau(31)] }),
      bed({
        ...calm,
        settings: [settings("08:00", { ...volumeControl, tidalVolumeMl: 250 })],
        mechanics: [relaxed("11:00", 22)],
      }),
      bed({ ...calm, mechanics: [plateau(31)], acknowledgements }),
      bed({ ...calm, mechanics: [] }),
      bed({ ...calm, mechanics: [relaxed("11:00", 25)] }),
      bed(calm),
    ];
    const tiers = ordered.map(({ group, rank }) => [group, rank?.tier]);
    expect(tiers).toEqual([
      ["outside", 0],
      ["outside", 0],
      ["outside", 1],
      ["outside", 2],
      ["unmeasured", 1],
      ["edge", 1],
      ["inside", 1],
    ]);
    const shuffled = [3, 6, 0, 5, 2, 4, 1].map((index) => ordered[index]!);
    expect(shuffled.sort(compareBeds)).toEqual(ordered);
  });

  it("S4 then by what is overdue longest", () => {
    const since = (clock: string) =>
      bed({
        ...calm,
        mechanics: [relaxed("11:00", 22)],
        settings: [settings(clock, volumeControl)],
        settingsChecks: [],
      });
    expect(compareBeds(since("07:00"), since("07:05"))).toBeLessThan(0);
    expect(compareBeds(since("07:05"), since("07:05"))).toBe(0);
  });
});
