import { describe, expect, it } from "vitest";
import { evaluate, targetsFromSet, type Derived, type Facts, type MechanicsFact, type State } from "@/lib/protocol";
import { author, height, moment } from "./chart";
import { chartDay, type Doing } from "./simulated-lung";

/** A stiff lung on too large a volume: plateau 28 + 8, brought down over the morning, then lost sight of. */
const lung = { complianceMlPerCmH2O: 20, resistanceCmH2OPerLPerS: 12 };
const day: Doing[] = [
  { at: "06:10", spo2: 93, exhaled: true },
  { at: "06:20", hold: "relaxed" },
  { at: "07:00", change: { tidalVolumeMl: 420 }, hold: "relaxed" },
  { at: "07:05", spo2: 94 },
  { at: "08:00", spo2: 93 },
  { at: "08:30", change: { peepCmH2O: 10 } },
  { at: "08:33", spo2: 90 },
  { at: "08:45", spo2: 95 },
  { at: "09:00", hold: "effort" },
  { at: "09:40", change: { tidalVolumeMl: 360 }, hold: "relaxed", exhaled: true },
  { at: "10:40", change: { respiratoryRate: 16 } },
  { at: "11:00", change: { fio2: 0.5 }, spo2: 94 },
  { at: "11:15", spo2: 93 },
  { at: "12:30", hold: "relaxed" },
  { at: "14:00", change: { respiratoryRate: 26 } },
  { at: "15:00", hold: "relaxed", spo2: 94 },
];
const facts: Facts = { ...chartDay(lung, day), heights: [height] };
const targets = targetsFromSet("unit-default", "order");
const episode = { intubatedAt: moment("05:30") };
const answer = (at: number, charted: Facts = facts) => evaluate({ facts: charted, targets, episode, at });

const step = 5 * 60_000;
const dayBegins = Date.parse(moment("06:00"));
const moments = Array.from({ length: (24 * 3_600_000) / step }, (_, index) => dayBegins + index * step);

/** Rule by rule and without haste, from the list of doings alone: what the plateau's word must be at a moment. */
function plateauByHand(at: number): Pick<Derived, "freshness" | "state" | "value" | "lastValue"> {
  const done = day.filter((doing) => Date.parse(moment(doing.at)) <= at);
  const holds = done.filter(({ hold }) => hold);
  const newest = holds.at(-1);
  const plateauOfHold = (doing: Doing) => {
    const found = facts.mechanics?.find(({ chartedAt }) => chartedAt === moment(doing.at)) as MechanicsFact;
    return found.plateauCmH2O!;
  };
  const relaxed = holds.filter(({ hold }) => hold === "relaxed").at(-1);
  const lastValue = relaxed ? plateauOfHold(relaxed) : null;
  if (!newest) return { freshness: "missing", state: "unmeasured", value: null, lastValue };
  const heldAt = Date.parse(moment(newest.at));
  const rates = { "10:40": -4, "14:00": 10 } as Record<string, number>;
  const expired = done.some(({ at: when, change }) => {
    if (!change || Date.parse(moment(when)) <= heldAt) return false;
    return change.tidalVolumeMl || change.peepCmH2O || (rates[when] ?? 0) > 0;
  });
  const age = at - heldAt;
  const hours = 3_600_000;
  const interval = newest.hold === "relaxed" ? 4 * hours : 0.5 * hours;
  const freshness = expired ? "changed-since" : age >= 8 * hours ? "lapsed" : age >= interval ? "due" : "current";
  const fresh = !expired && age < 8 * hours;
  if (!fresh || newest.hold === "effort") return { freshness, state: "unmeasured", value: null, lastValue };
  const plateau = plateauOfHold(newest);
  const state: State = plateau > 30 ? "outside" : plateau >= 29.5 ? "edge" : "inside";
  return { freshness, state, value: plateau, lastValue: plateau };
}

describe("a simulated day", { timeout: 30_000 }, () => {
  it("F1 F4 F6 V8 the plateau's word and state at every 5 min are those worked out by hand", () => {
    for (const at of moments) {
      const { freshness, state, value, lastValue } = answer(at).derived.plateauCmH2O;
      expect({ at: new Date(at).toISOString(), freshness, state, value, lastValue }).toEqual({
        at: new Date(at).toISOString(),
        ...plateauByHand(at),
      });
    }
  });

  it("F7 S6 from the first outside plateau to the first fresh one inside the bed stays outside, since then", () => {
    const during = moments.filter((at) => at >= Date.parse(moment("06:20")) && at < Date.parse(moment("09:40")));
    for (const at of during) {
      const { group, derived } = answer(at);
      expect(group).toBe("outside");
      expect(derived.plateauCmH2O.lastState === "outside" || derived.drivingPressureCmH2O.lastState === "outside").toBe(
        true,
      );
      expect(derived.drivingPressureCmH2O.since).toBe(moment("06:20"));
    }
  });

  it("F5 the SpO2 of 08:33, 3 min after a PEEP step, is outside at once; that of 08:45 is read", () => {
    expect(answer(Date.parse(moment("08:35"))).derived.spo2Percent).toMatchObject({ state: "outside", value: 90 });
    expect(answer(Date.parse(moment("08:50"))).derived.spo2Percent).toMatchObject({
      state: "inside",
      value: 95,
      since: null,
    });
    expect(answer(Date.parse(moment("11:05"))).derived.spo2Percent).toMatchObject({
      freshness: "too-soon",
      value: null,
    });
  });

  it("F1 walking by validUntil meets every change of word that 5 min steps meet", () => {
    const words = (at: number) =>
      JSON.stringify(Object.values(answer(at).derived).map(({ freshness, state, value }) => [freshness, state, value]));
    let at = dayBegins;
    let horizon = Date.parse(answer(at).validUntil!);
    let seen = words(at);
    for (const next of moments) {
      while (next >= horizon) {
        at = horizon;
        const reached = answer(at);
        seen = words(at);
        horizon = reached.validUntil === null ? Infinity : Date.parse(reached.validUntil);
      }
      expect(words(next)).toBe(seen);
    }
  });

  it("S6 a late entry, a correction and a void change the past, the words and since, truthfully", () => {
    const at = Date.parse(moment("08:20"));
    const before = answer(at).derived.drivingPressureCmH2O;
    expect(before).toMatchObject({ state: "outside", freshness: "current", since: moment("06:20") });

    const late = { id: "9001", chartedAt: moment("08:10"), recordedAt: moment("08:19"), author, peepCmH2O: 6 };
    const withLate = { ...facts, settings: [...facts.settings!, late].sort(byTime) };
    expect(answer(at, withLate).derived.drivingPressureCmH2O).toMatchObject({
      freshness: "changed-since",
      changedAt: moment("08:10"),
      lastState: "outside",
      since: moment("06:20"),
    });

    const [first, ...later] = facts.mechanics!.filter(({ plateauCmH2O }) => plateauCmH2O);
    const corrected = { ...facts, mechanics: [{ ...first!, id: "9002", plateauCmH2O: 22 }, ...later] };
    expect(answer(at, corrected).derived.drivingPressureCmH2O.since).toBe(moment("07:00"));

    expect(answer(at, { ...facts, settings: withLate.settings.filter(({ id }) => id !== late.id) })).toEqual(
      answer(at),
    );
    const voided = { ...facts, mechanics: later };
    expect(answer(at, voided).derived.drivingPressureCmH2O.since).toBe(moment("07:00"));
  });
});

function byTime(a: { chartedAt: unknown }, b: { chartedAt: unknown }): number {
  return Date.parse(String(a.chartedAt)) - Date.parse(String(b.chartedAt));
}
