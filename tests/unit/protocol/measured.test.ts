import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { evaluate, noteCodes, type MechanicsFact } from "@/lib/protocol";
import { anyFacts, anyMoment, anyTargets } from "./arbitrary-facts";
import { fact, judge, moment, relaxed, settings, spo2, volumeControl } from "./chart";

describe("measured fields", () => {
  const mechanics: MechanicsFact[] = [
    relaxed("10:00", 24, { peakCmH2O: 32, totalPeepCmH2O: 11 }),
    fact("10:05", { exhaledTidalVolumeMl: 410 }),
  ];

  it("F1 F6 each says how fresh it is, by its own row and interval", () => {
    const facts = {
      mechanics,
      observations: [spo2("10:20", 94)],
      settings: [settings("08:00", volumeControl), settings("10:30", { flowLPerMin: 70 })],
    };
    const { measured } = judge("10:40", { facts });
    expect(measured.peakCmH2O).toMatchObject({ freshness: "changed-since", changedAt: moment("10:30") });
    expect(measured.totalPeepCmH2O).toMatchObject({ freshness: "current", dueAt: moment("14:00") });
    expect(measured.plateauCmH2O).toMatchObject({ freshness: "current", chartedAt: moment("10:00") });
    expect(measured.exhaledTidalVolumeMl).toMatchObject({ freshness: "current", dueAt: moment("14:05") });
    expect(measured.spo2Percent).toMatchObject({ freshness: "current", dueAt: moment("11:20") });
    expect(measured.minuteVolumeLPerMin).toMatchObject({ freshness: "missing", chartedAt: null });
  });

  it("F2 nothing measured is due under comfort", () => {
    const { measured } = judge("20:00", { facts: { mechanics }, targets: { conditions: ["comfort"] } });
    expect(Object.values(measured).every(({ dueAt }) => dueAt === null)).toBe(true);
  });
});

describe("note codes", () => {
  it("every code an answer carries stands in the table", () => {
    fc.assert(
      fc.property(anyFacts, anyTargets, anyMoment, (facts, targets, at) => {
        const { derived } = evaluate({ facts, targets, at, unit: { barometricPressureMmHg: 630 } });
        const codes = Object.values(derived).flatMap(({ notes, alternatives }) => [
          ...notes,
          ...alternatives.map(({ note }) => note),
        ]);
        expect(codes.filter((code) => !(code in noteCodes))).toEqual([]);
      }),
      { numRuns: 60 },
    );
  });
});
