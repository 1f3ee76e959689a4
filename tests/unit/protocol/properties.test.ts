import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { derivedNames, evaluate, type Evaluation, type Facts, type State } from "@/lib/protocol";
import { anyFacts, anyMoment, anyPauses, anyTargets, dayBegins } from "./arbitrary-facts";
import { judge, relaxed, settings, volumeControl } from "./chart";

const anyBedside = fc.record({ facts: anyFacts, targets: anyTargets, at: anyMoment, pauses: anyPauses });
type AnyBedside = typeof anyBedside extends fc.Arbitrary<infer Bedside> ? Bedside : never;

const unit = { barometricPressureMmHg: 630 };
const answerTo = ({ facts, targets, at, pauses }: AnyBedside): Evaluation =>
  evaluate({ facts, targets, unit, at, episode: { intubatedAt: dayBegins, pauses } });

const holds = (property: (bedside: AnyBedside) => void, numRuns = 120) =>
  fc.assert(fc.property(anyBedside, property), { numRuns });

/** What a later moment may not change before `validUntil`: everything but that moment itself. */
const withoutHorizon = ({ validUntil: _validUntil, ...answer }: Evaluation) => answer;

function frozen<Value>(value: Value): Value {
  if (typeof value === "object" && value !== null) {
    Object.values(value).forEach(frozen);
    Object.freeze(value);
  }
  return value;
}

function shuffled(facts: Facts): Facts {
  return Object.fromEntries(Object.entries(facts).map(([kind, list]) => [kind, [...list].reverse()]));
}

/** One id for each fact: two facts of one moment keep one order whatever the array's. */
function withOwnIds(facts: Facts): Facts {
  const numbered = (list: readonly object[]) => list.map((one, index) => ({ ...one, id: String(index + 1) }));
  return Object.fromEntries(Object.entries(facts).map(([kind, list]) => [kind, numbered(list)])) as unknown as Facts;
}

/** Generating charts takes its time on a busy machine. */
const timeout = 30_000;

describe("whatever may be charted", { timeout }, () => {
  it("V14 never throws, and answers a finite number or null", () => {
    holds((bedside) => {
      const { derived } = answerTo(bedside);
      for (const name of derivedNames) {
        for (const value of [derived[name].value, derived[name].lastValue]) {
          expect(value === null || Number.isFinite(value), `${name} ${value}`).toBe(true);
        }
      }
    }, 250);
  });

  it("V14 never throws on missing facts, targets, unit and episode", () => {
    expect(evaluate({ at: dayBegins }).group).toBe("unmeasured");
    expect(evaluate({ at: dayBegins, facts: {}, targets: { origin: "order", conditions: [] } }).group).toBe(
      "not-judged",
    );
  });

  it("F1 a value is shown only when current, due, or too soon and outside", () => {
    holds((bedside) => {
      for (const [name, { value, freshness, state }] of Object.entries(answerTo(bedside).derived)) {
        if (value === null) continue;
        const mayShow =
          freshness === "current" || freshness === "due" || (freshness === "too-soon" && state === "outside");
        expect(mayShow, `${name} ${freshness} ${state}`).toBe(true);
      }
    });
  });

  it("F6 what a change expired, and what lapsed, never reads inside or at the edge", () => {
    holds((bedside) => {
      for (const { freshness, state } of Object.values(answerTo(bedside).derived)) {
        if (freshness === "changed-since" || freshness === "lapsed" || freshness === "missing") {
          expect([null, "unmeasured", "not-asked"]).toContain(state);
        }
      }
    });
  });

  it("F9 what is shown is also the last that is known", () => {
    holds((bedside) => {
      for (const { value, lastValue, state, lastState, notes } of Object.values(answerTo(bedside).derived)) {
        if (value === null || notes.includes("exhaled-outside-not-measured-since") || state === "not-asked") continue;
        expect([lastValue, lastState]).toEqual([value, state]);
      }
    });
  });

  it("S3 a check last outside keeps the bed in the outside group", () => {
    holds((bedside) => {
      const { derived, group } = answerTo(bedside);
      const held = [derived.plateauCmH2O, derived.drivingPressureCmH2O, derived.vtMlPerKg, derived.ph].some(
        ({ state, lastState }) => lastState === "outside" && state !== "not-asked",
      );
      if (held && group !== "away") expect(group).toBe("outside");
    });
  });

  it("V14 the same facts give the same answer, and nothing given is changed", () => {
    holds((bedside) => {
      const first = answerTo({ ...bedside, facts: frozen(structuredClone(bedside.facts)) });
      expect(answerTo({ ...bedside, facts: structuredClone(bedside.facts) })).toEqual(first);
      const kept = bedside.facts;
      expect(answerTo({ ...bedside, facts: kept })).toEqual(answerTo({ ...bedside, facts: kept }));
    }, 60);
  });

  it("S6 the order in which the arrays come makes no difference: a late entry stands where it was true", () => {
    holds((bedside) => {
      const facts = withOwnIds(bedside.facts);
      expect(answerTo({ ...bedside, facts: shuffled(facts) })).toEqual(answerTo({ ...bedside, facts }));
    }, 80);
  });

  it("S6 what is charted after a moment changes nothing before it", () => {
    holds((bedside) => {
      const known = (list: readonly { chartedAt: unknown }[]) =>
        list.filter(({ chartedAt }) => Date.parse(String(chartedAt)) <= bedside.at);
      const facts = Object.fromEntries(Object.entries(bedside.facts).map(([kind, list]) => [kind, known(list)]));
      expect(withoutHorizon(answerTo({ ...bedside, facts }))).toEqual(withoutHorizon(answerTo(bedside)));
    });
  });

  it("F1 nothing changes by time alone before validUntil", () => {
    fc.assert(
      fc.property(anyBedside, fc.double({ min: 0, max: 0.999, noNaN: true }), (bedside, share) => {
        const now = answerTo(bedside);
        const horizon = now.validUntil === null ? bedside.at + 86_400_000 : Date.parse(now.validUntil);
        expect(horizon).toBeGreaterThan(bedside.at);
        const later = bedside.at + Math.floor((horizon - bedside.at) * share);
        expect(withoutHorizon(answerTo({ ...bedside, at: later }))).toEqual(withoutHorizon(now));
      }),
      { numRuns: 150 },
    );
  });
});

const severity: Record<State, number> = { inside: 0, edge: 1, outside: 2, unmeasured: 3, "not-asked": 4 };

describe("monotone", { timeout }, () => {
  it("S2 a higher plateau never reads better", () => {
    const pressure = fc.integer({ min: 110, max: 600 }).map((tenths) => tenths / 10);
    fc.assert(
      fc.property(pressure, pressure, (a, b) => {
        const [lower, higher] = a < b ? [a, b] : [b, a];
        const states = (plateau: number) =>
          judge("10:10", { facts: { mechanics: [relaxed("10:00", plateau)] } }).derived;
        for (const name of ["plateauCmH2O", "drivingPressureCmH2O"] as const) {
          expect(severity[states(higher)[name].state!]).toBeGreaterThanOrEqual(severity[states(lower)[name].state!]);
        }
      }),
    );
  });

  it("S2 further from the order's middle, a set volume never reads better", () => {
    const state = (tidalVolumeMl: number) =>
      judge("09:00", { facts: { settings: [settings("08:00", { ...volumeControl, tidalVolumeMl })] } }).derived
        .vtMlPerKg;
    const middle = 6 * 70.566;
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 380 }), fc.integer({ min: 0, max: 380 }), fc.boolean(), (a, b, above) => {
        const [near, far] = [Math.min(a, b), Math.max(a, b)].map((away) => (above ? middle + away : middle - away));
        expect(severity[state(far!).state!]).toBeGreaterThanOrEqual(severity[state(near!).state!]);
      }),
    );
  });
});
