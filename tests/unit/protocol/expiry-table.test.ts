import { describe, expect, it } from "vitest";
import type { Evaluation, Facts } from "@/lib/protocol";
import { fact, gas, judge, pressureControl, relaxed, settings, spo2, volumeControl } from "./chart";

/** The table of rule F6, written out anew: which result each change expires. */
const pressures = ["plateauCmH2O", "drivingPressureCmH2O", "staticComplianceMlPerCmH2O", "intrinsicPeepCmH2O"];
const flow = ["airwayResistanceCmH2OPerLPerS", "dynamicComplianceMlPerCmH2O", "measured:peakCmH2O"];
const power = ["mechanicalPowerJPerMin"];
const breaths = [
  "measured:exhaledTidalVolumeMl",
  "measured:minuteVolumeLPerMin",
  "measured:meanAirwayPressureCmH2O",
  "respiratoryRateTotal",
];
const carbonDioxide = ["paco2MmHg", "ph", "ventilatoryRatio", "measured:etco2MmHg"];
const oxygen = [
  "pao2MmHg",
  "pfRatio",
  "sfRatio",
  "spo2Percent",
  "oxygenationIndex",
  "oxygenSaturationIndex",
  "alveolarArterialGradientMmHg",
];
const all = { pressures, flow, power, breaths, carbonDioxide, oxygen };
type Row = keyof typeof all;
const everyRow = Object.keys(all) as Row[];

const read = (clock: string): Facts => ({
  mechanics: [
    relaxed(clock, 24, {
      peakCmH2O: 32,
      totalPeepCmH2O: 11,
      exhaledTidalVolumeMl: 420,
      respiratoryRateTotal: 20,
      minuteVolumeLPerMin: 8.4,
      meanAirwayPressureCmH2O: 15,
    }),
  ],
  observations: [{ ...spo2(clock, 94), etco2MmHg: 38 }],
  bloodGases: [gas(clock, { ph: 7.36, paco2MmHg: 44, pao2MmHg: 80 })],
});

type Added = { [Kind in "settings" | "positions" | "therapies"]?: object };

function after(added: Added, begins: object): Evaluation {
  const one = (body: object | undefined) => (body ? [fact("10:30", body)] : []);
  const facts = {
    ...read("10:00"),
    settings: [settings("08:00", begins), ...one(added.settings)],
    positions: one(added.positions),
    therapies: one(added.therapies),
  };
  return judge("10:31", { facts: facts as unknown as Facts });
}

function freshness(answer: Evaluation, name: string): string | undefined {
  const [kind, field = ""] = name.split(":");
  if (kind === "measured") return answer.measured[field]?.freshness;
  return answer.derived[name as keyof Evaluation["derived"]].freshness;
}

const square = { ...volumeControl, flowPattern: "square" };
const volumeChanges: [string, Added, Row[]][] = [
  ["a volume", { settings: { tidalVolumeMl: 430 } }, ["pressures", "flow", "power", "breaths", "carbonDioxide"]],
  ["a mode", { settings: pressureControl }, everyRow],
  ["PEEP", { settings: { peepCmH2O: 12 } }, ["pressures", "flow", "power", "breaths", "oxygen"]],
  ["rate up", { settings: { respiratoryRate: 22 } }, ["pressures", "flow", "power", "breaths", "carbonDioxide"]],
  ["rate down", { settings: { respiratoryRate: 18 } }, ["power", "breaths", "carbonDioxide"]],
  ["a longer inspiratory time", { settings: { inspiratoryTimeS: 1 } }, everyRow],
  ["a shorter inspiratory time", { settings: { inspiratoryTimeS: 0.8 } }, ["breaths", "carbonDioxide", "oxygen"]],
  ["a lower flow", { settings: { flowLPerMin: 50 } }, ["pressures", "flow", "power"]],
  ["a higher flow", { settings: { flowLPerMin: 70 } }, ["flow"]],
  ["a flow pattern", { settings: { flowPattern: "decelerating" } }, ["flow"]],
  ["FiO2", { settings: { fio2: 0.6 } }, ["oxygen"]],
  ["a trigger", { settings: { triggerType: "flow", triggerLPerMin: 3 } }, []],
  ["a prone turn", { positions: { position: "prone" } }, everyRow],
  ["a lateral turn", { positions: { position: "left-lateral" } }, ["pressures", "flow", "power", "breaths", "oxygen"]],
  ["'still supine'", { positions: { position: "supine", headOfBedDegrees: 45 } }, []],
  ["the head of the bed alone", { positions: { headOfBedDegrees: 30 } }, []],
  [
    "neuromuscular block",
    { therapies: { therapy: "neuromuscular-block", on: true } },
    ["pressures", "flow", "power", "breaths", "carbonDioxide"],
  ],
  ["block charted as off", { therapies: { therapy: "neuromuscular-block", on: false } }, []],
  ["recruitment", { therapies: { therapy: "recruitment" } }, ["pressures", "flow", "power", "oxygen"]],
  ["a tube", { therapies: { therapy: "tube" } }, everyRow],
  ["an event", { therapies: { therapy: "event", event: "bronchoscopy" } }, ["pressures", "flow", "power"]],
  ["ECMO on", { therapies: { therapy: "ecmo", on: true } }, everyRow],
  ["a spontaneous breathing trial", { therapies: { therapy: "sbt" } }, []],
];

/** On ECMO the ventilatory ratio is not worked out (V11), so it cannot expire. */
const notWorkedOut = (what: string, name: string) => what === "ECMO on" && name === "ventilatoryRatio";

describe("what a change expires", () => {
  it.each(volumeChanges)("F6 %s expires its rows and no other result", (what, added, rows) => {
    const answer = after(added, square);
    for (const row of everyRow) {
      for (const name of all[row].filter((one) => !notWorkedOut(what, one))) {
        const word = freshness(answer, name);
        expect(`${name} ${word}`).toBe(rows.includes(row) ? `${name} changed-since` : `${name} ${word}`);
        if (!rows.includes(row)) expect(["current", "due"], name).toContain(word);
      }
    }
  });

  it("F6 a turn back to supine, and one out of prone, are turns; one between the sides is none", () => {
    const turned = (from: string, to: string) => {
      const positions = [fact("08:30", { position: from }), fact("10:30", { position: to })];
      const facts = { ...read("10:00"), positions } as unknown as Facts;
      return judge("10:31", { facts }).derived.paco2MmHg.freshness;
    };
    expect(turned("left-lateral", "supine")).toBe("changed-since");
    expect(turned("prone", "supine")).toBe("changed-since");
    expect(turned("prone", "right-lateral")).toBe("changed-since");
    expect(turned("left-lateral", "right-lateral")).toBe("current");
  });

  it("F6 pressure above PEEP counts as pressure", () => {
    const answer = after({ settings: { pressureAbovePeepCmH2O: 15 } }, pressureControl);
    expect(answer.derived.plateauCmH2O.freshness).toBe("changed-since");
    expect(answer.derived.ph.freshness).toBe("changed-since");
    expect(answer.derived.spo2Percent.freshness).toBe("current");
  });

  it.each([
    ["sweep", { sweepLPerMin: 5 }, "changed-since", "current"],
    ["blood flow", { bloodFlowLPerMin: 5 }, "current", "changed-since"],
    ["nothing new", { sweepLPerMin: 3, bloodFlowLPerMin: 4 }, "current", "current"],
  ])("F6 ECMO's %s expires what it drives", (_what, body, co2, o2) => {
    const ecmo = { therapy: "ecmo" as const, on: true };
    const facts = {
      ...read("10:00"),
      therapies: [
        fact("08:00", { ...ecmo, sweepLPerMin: 3, bloodFlowLPerMin: 4 }),
        fact("10:30", { ...ecmo, ...body }),
      ],
    };
    const { derived } = judge("10:31", { facts });
    expect(derived.paco2MmHg.freshness).toBe(co2);
    expect(derived.pao2MmHg.freshness).toBe(o2);
    expect(derived.plateauCmH2O.freshness).toBe("current");
  });

  it("F6 ECMO off is a change, and clears what it ran at", () => {
    const ecmo = { therapy: "ecmo" as const };
    const therapies = [fact("08:00", { ...ecmo, on: true, sweepLPerMin: 3 }), fact("10:30", { ...ecmo, on: false })];
    expect(judge("10:31", { facts: { ...read("10:00"), therapies } }).derived.ph.freshness).toBe("changed-since");
  });

  const aprv = { mode: "APRV", pHighCmH2O: 26, pLowCmH2O: 0, tHighS: 5, tLowS: 0.5, fio2: 0.5 } as const;
  it.each([
    ["P-high", { pHighCmH2O: 28 }, true],
    ["P-low", { pLowCmH2O: 2 }, true],
    ["T-high", { tHighS: 6 }, true],
    ["T-low", { tLowS: 0.4 }, true],
    ["nothing", { pHighCmH2O: 26 }, false],
  ])("F6 APRV's %s counts as pressure and PEEP, or as rate and time", (_what, body, expires) => {
    const { derived } = after({ settings: body }, aprv);
    const word = expires ? "changed-since" : "current";
    expect([derived.ph.freshness, derived.pao2MmHg.freshness]).toEqual([word, word]);
  });

  const hfov = { mode: "HFOV", meanAirwayPressureCmH2O: 24, frequencyHz: 6, amplitudeCmH2O: 70, fio2: 0.6 } as const;
  it.each([
    ["mean pressure", { meanAirwayPressureCmH2O: 26 }, "current", "changed-since"],
    ["frequency", { frequencyHz: 5 }, "changed-since", "current"],
    ["amplitude", { amplitudeCmH2O: 75 }, "changed-since", "current"],
  ])("F6 HFOV's %s counts as PEEP, rate or pressure", (_what, body, co2, o2) => {
    const { derived } = after({ settings: body }, hfov);
    expect([derived.ph.freshness, derived.pao2MmHg.freshness]).toEqual([co2, o2]);
  });

  it("F6 HFNO's flow counts as PEEP", () => {
    const { derived } = after({ settings: { flowLPerMin: 50 } }, { mode: "HFNO", flowLPerMin: 40, fio2: 0.5 });
    expect([derived.ph.freshness, derived.pao2MmHg.freshness]).toEqual(["current", "changed-since"]);
  });

  it("F8 a lower rate or a longer expiration expires no pressure", () => {
    for (const body of [{ respiratoryRate: 12 }, { inspiratoryTimeS: 0.7 }, { flowLPerMin: 80 }]) {
      expect(after({ settings: body }, square).derived.plateauCmH2O.freshness).toBe("current");
    }
  });
});
