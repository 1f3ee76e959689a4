import { describe, expect, it } from "vitest";
import type { MechanicsFact } from "@/lib/protocol";
import { fact, judge, metric, moment, pressureControl, settings, volumeControl, type Bedside } from "./chart";

const name = "vtMlPerKg";
const exhaled = (clock: string, exhaledTidalVolumeMl: number, more: object = {}) =>
  fact(clock, { exhaledTidalVolumeMl, ...more });
const pbwKg = 70.566;

const inMode = (begins: object, mechanics: object[], more: object = {}): Bedside => ({
  facts: { settings: [settings("08:00", begins)], mechanics: mechanics as MechanicsFact[], ...more },
});
const volume = (mechanics: object[], more: object = {}) => inMode(volumeControl, mechanics, more);

describe("the volume judged", () => {
  it("V6 in A/C-VC is the set one, alone where no fresh exhaled one stands beside it", () => {
    const alone = metric(name, "10:00", volume([]));
    expect(alone).toMatchObject({ state: "inside", freshness: "current", notes: ["set-volume-alone"] });
    expect(alone.value).toBeCloseTo(420 / pbwKg, 9);
    expect(alone.inputs[0]).toMatchObject({ name: "tidalVolumeMl", value: 420 });
  });

  it.each([
    [462, 420, []],
    [462.1, 462.1, ["exhaled-differs"]],
    [378, 420, []],
    [377.9, 420, ["exhaled-differs"]],
    [357, 420, ["exhaled-differs"]],
    [356.9, 420, ["exhaled-differs", "leak"]],
    [0, 420, ["exhaled-differs", "leak"]],
  ])("V6 exhaled %s beside set 420 judges %s", (measured, judged, notes) => {
    const derived = metric(name, "10:10", volume([exhaled("10:00", measured)]));
    expect(derived.value).toBeCloseTo(judged / pbwKg, 9);
    expect(derived.notes).toEqual(notes);
    expect(derived.alternatives).toHaveLength(notes.length > 0 ? 1 : 0);
  });

  it("V6 an exhaled volume older than a change that expires it is compared with nothing", () => {
    const changed = { settings: [settings("08:00", volumeControl), settings("10:30", { tidalVolumeMl: 350 })] };
    const derived = metric(name, "10:40", volume([exhaled("10:00", 420)], changed));
    expect(derived.value).toBeCloseTo(350 / pbwKg, 9);
    expect(derived.notes).toEqual(["set-volume-alone"]);
  });

  it("V6 F7 an exhaled volume last outside and no longer fresh keeps VT in the outside group, set value shown", () => {
    const changed = { settings: [settings("08:00", volumeControl), settings("10:30", { tidalVolumeMl: 380 })] };
    const readings = [exhaled("10:00", 600)];
    expect(metric(name, "10:10", volume(readings, changed)).state).toBe("outside");
    const held = judge("10:40", volume(readings, changed));
    expect(held.derived[name]).toMatchObject({ lastState: "outside", since: moment("10:00"), freshness: "current" });
    expect(held.derived[name].value).toBeCloseTo(380 / pbwKg, 9);
    expect(held.derived[name].lastValue).toBeCloseTo(600 / pbwKg, 9);
    expect(held.group).toBe("outside");
    const fresh = judge("10:50", volume([...readings, exhaled("10:45", 385)], changed));
    expect(fresh.derived[name].lastState).toBe("inside");
    expect(fresh.group).not.toBe("outside");
  });

  it.each([
    ["A/C-PC", pressureControl],
    ["A/C-vtPC", { ...volumeControl, mode: "A/C-vtPC" }],
    ["CSV-PS", { mode: "CSV-PS", pressureSupportCmH2O: 10, peepCmH2O: 5, fio2: 0.4 }],
    ["CPAP", { mode: "CPAP", peepCmH2O: 5, fio2: 0.4 }],
    ["APRV", { mode: "APRV", pHighCmH2O: 26, pLowCmH2O: 0, tHighS: 5, tLowS: 0.5, fio2: 0.5 }],
  ])("V6 %s is judged on the exhaled volume", (_mode, begins) => {
    expect(metric(name, "10:00", inMode(begins, []))).toMatchObject({ state: "unmeasured", freshness: "missing" });
    const derived = metric(name, "10:10", inMode(begins, [exhaled("10:00", 600)]));
    expect(derived).toMatchObject({ state: "outside", freshness: "current" });
    expect(metric(name, "10:10", inMode(begins, [exhaled("10:00", 0)]))).toMatchObject({ state: "outside", value: 0 });
  });

  const simv = { pressureSupportCmH2O: 10 };
  it("V6 SIMV is judged on the larger of mandatory and spontaneous", () => {
    const vc = { ...volumeControl, ...simv, mode: "SIMV-VC-PS" };
    const spontaneous = fact("10:00", { spontaneousTidalVolumeMl: 600, exhaledTidalVolumeMl: 415 });
    expect(metric(name, "10:10", inMode(vc, [spontaneous])).value).toBeCloseTo(600 / pbwKg, 9);
    const smaller = fact("10:00", { spontaneousTidalVolumeMl: 300 });
    expect(metric(name, "10:10", inMode(vc, [smaller])).value).toBeCloseTo(420 / pbwKg, 9);
    const pc = { ...pressureControl, ...simv, mode: "SIMV-PC-PS" };
    expect(metric(name, "10:10", inMode(pc, [spontaneous])).value).toBeCloseTo(600 / pbwKg, 9);
    expect(metric(name, "10:10", inMode(pc, [exhaled("10:00", 430)]))).toMatchObject({
      value: 430 / pbwKg,
      notes: ["spontaneous-not-measured"],
    });
  });

  it("V9 HFOV, NIV and HFNO do not ask it", () => {
    const hfov = { mode: "HFOV", meanAirwayPressureCmH2O: 24, frequencyHz: 6, amplitudeCmH2O: 70, fio2: 0.6 };
    const niv = { mode: "NIV", pressureSupportCmH2O: 8, peepCmH2O: 6, fio2: 0.4 };
    for (const begins of [hfov, niv, { mode: "HFNO", flowLPerMin: 50, fio2: 0.5 }]) {
      expect(metric(name, "10:10", inMode(begins, [exhaled("10:00", 900)])).state).toBe("not-asked");
    }
  });

  it("F6 the exhaled volume of pressure control expires with a change of its row, and keeps its last value", () => {
    const changed = {
      settings: [settings("08:00", pressureControl), settings("10:30", { pressureAbovePeepCmH2O: 12 })],
    };
    const derived = metric(name, "10:40", inMode(pressureControl, [exhaled("10:00", 420)], changed));
    expect(derived).toMatchObject({
      value: null,
      state: "unmeasured",
      freshness: "changed-since",
      lastState: "inside",
    });
    expect(derived.lastValue).toBeCloseTo(420 / pbwKg, 9);
  });

  it("F7 a set volume last outside stays outside through a change of mode until a fresh volume is inside", () => {
    const changed = {
      settings: [settings("08:00", { ...volumeControl, tidalVolumeMl: 620 }), settings("10:30", pressureControl)],
    };
    const held = judge("10:40", volume([], changed));
    expect(held.derived[name]).toMatchObject({ state: "unmeasured", lastState: "outside", since: moment("08:00") });
    expect(held.group).toBe("outside");
    expect(judge("10:50", volume([exhaled("10:45", 450)], changed)).derived[name].lastState).toBe("inside");
  });

  it("S6 since when is the time the volume left its range, over set and measured alike", () => {
    const facts = {
      settings: [
        settings("08:00", volumeControl),
        settings("09:00", { tidalVolumeMl: 580 }),
        settings("10:00", { tidalVolumeMl: 600 }),
      ],
      mechanics: [exhaled("10:05", 700)],
    };
    expect(metric(name, "10:10", { facts }).since).toBe(moment("09:00"));
    expect(metric(name, "08:30", { facts }).since).toBeNull();
  });
});

describe("predicted body weight", () => {
  const tall = (body: object) => ({ heights: [fact("07:00", { method: "measured-lying", ...body })] });
  const with_ = (body: object, settingsBody: object = volumeControl): Bedside => ({
    facts: { settings: [settings("08:00", settingsBody)], ...tall(body) } as Bedside["facts"],
  });

  it("V12 no height gives no volume for each kilogram", () => {
    expect(metric(name, "09:00", { facts: { heights: [] } })).toMatchObject({
      value: null,
      state: "unmeasured",
      freshness: "missing",
      notes: ["set-volume-alone", "needs-height"],
    });
  });

  it("V12 without a sex both answers stand side by side, with a state only where they share it", () => {
    // 175 cm: 70.566 kg for a man, 66.066 for a woman.
    const inside = metric(name, "09:00", with_({ heightCm: 175 }));
    expect(inside).toMatchObject({ value: null, state: "inside", freshness: "current" });
    expect(inside.alternatives.map(({ value, note }) => [note, value?.toFixed(3)])).toEqual([
      ["male", "5.952"],
      ["female", "6.357"],
    ]);
    const between = metric(name, "09:00", with_({ heightCm: 175 }, { ...volumeControl, tidalVolumeMl: 550 }));
    expect(between).toMatchObject({ value: null, state: "unmeasured" });
    const outside = judge("09:00", with_({ heightCm: 175 }, { ...volumeControl, tidalVolumeMl: 620 }));
    expect(outside.derived[name]).toMatchObject({ value: null, state: "outside" });
    expect(outside.group).toBe("outside");
  });

  it("V12 below 120 cm there is no PBW; from 120 there is, and below 152.4 the line is extrapolated", () => {
    const sexForPbw = "female";
    expect(metric(name, "09:00", with_({ heightCm: 119.9, sexForPbw })).value).toBeNull();
    const shortest = metric(name, "09:00", with_({ heightCm: 120, sexForPbw }));
    expect(shortest.value).toBeCloseTo(420 / 16.016, 6);
    expect(shortest.notes).toContain("pbw-extrapolated");
    expect(metric(name, "09:00", with_({ heightCm: 152.3, sexForPbw })).notes).toContain("pbw-extrapolated");
    expect(metric(name, "09:00", with_({ heightCm: 152.4, sexForPbw })).notes).not.toContain("pbw-extrapolated");
  });

  it("V12 an order in millilitres needs no PBW, and the answer is in millilitres", () => {
    const bedside = {
      ...with_({ heightCm: 110, sexForPbw: "female" }),
      targets: { vtMlPerKg: null, vtMl: { min: 200, max: 400 } },
    };
    expect(metric(name, "09:00", bedside)).toMatchObject({ unit: "mL", value: 420, state: "outside" });
    const fits = { ...bedside, targets: { vtMlPerKg: null, vtMl: { min: 200, max: 420 } } };
    expect(metric(name, "09:00", fits).state).toBe("edge");
  });

  it("V6 a volume that nobody ordered is shown and not judged, and its last value stays", () => {
    const targets = { vtMlPerKg: null };
    const shown = metric(name, "09:00", { targets });
    expect(shown).toMatchObject({ state: null, limit: null, freshness: "current", lastState: null });
    expect(shown.lastValue).toBe(shown.value);
    const changed = {
      settings: [settings("08:00", pressureControl), settings("10:30", { peepCmH2O: 12 })],
    };
    const stale = metric(name, "10:40", { ...inMode(pressureControl, [exhaled("10:00", 420)], changed), targets });
    expect(stale).toMatchObject({ value: null, freshness: "changed-since", lastValue: 420 / pbwKg });
  });

  it("V12 the newest height and the newest sex hold", () => {
    const heights = [
      fact("07:00", { heightCm: 165, sexForPbw: "male", method: "reported" }),
      fact("09:00", { heightCm: 175, method: "measured-lying" }),
    ];
    const facts = { heights } as Bedside["facts"];
    expect(metric(name, "08:30", { facts }).value).toBeCloseTo(420 / (50 + 0.91 * 12.6), 9);
    expect(metric(name, "09:30", { facts }).value).toBeCloseTo(420 / pbwKg, 9);
  });
});

describe("the volume's edge", () => {
  const ordered = (min: number | undefined, max: number) => ({ targets: { vtMlPerKg: { min, max } } });
  const state = (tidalVolumeMl: number, min: number | undefined, max: number) =>
    metric(name, "09:00", {
      ...volume([], { settings: [settings("08:00", { ...volumeControl, tidalVolumeMl })] }),
      ...ordered(min, max),
    }).state;

  it("S2 a set volume within half a machine step of a limit counts as on it", () => {
    // 6 × 70.566 = 423.396 mL.
    expect(state(420, 6, 8)).toBe("edge");
    expect(state(418.4, 6, 8)).toBe("edge");
    expect(state(6 * pbwKg - 5, 6, 8)).toBe("edge");
    expect(state(418.3, 6, 8)).toBe("outside");
    expect(state(569, 6, 8)).toBe("edge");
    expect(state(570, 6, 8)).toBe("outside");
  });

  it("S2 the edge is 5 % of the range's width on its inner side", () => {
    // 4–8: 0.2 mL/kg, so from 7.8 (550.4 mL); the half step reaches only to 559.5.
    expect(state(550.5, 4, 8)).toBe("edge");
    expect(state(550.3, 4, 8)).toBe("inside");
  });

  it("S2 a measured volume gets no half step", () => {
    const mechanics = [exhaled("10:00", 420)];
    const bedside = { ...inMode(pressureControl, mechanics), ...ordered(6, 8) };
    expect(metric(name, "10:10", bedside).state).toBe("outside");
  });

  it("S2 one-sided, only exactly on the limit is the edge", () => {
    const bedside = (ml: number) => ({ ...inMode(pressureControl, [exhaled("10:00", ml)]), ...ordered(undefined, 4) });
    expect(metric(name, "10:10", bedside(4 * pbwKg)).state).toBe("edge");
    expect(metric(name, "10:10", bedside(4 * pbwKg - 0.1)).state).toBe("inside");
    expect(metric(name, "10:10", bedside(4 * pbwKg + 0.1)).state).toBe("outside");
  });
});
