import { describe, expect, it } from "vitest";
import { settingsInForce } from "@/lib/protocol";
import { fact, gas, judge, metric, moment, relaxed, settings, spo2, volumeControl } from "./chart";

const inForce = (changes: object[], at: string) =>
  settingsInForce({ changes: changes as Parameters<typeof settingsInForce>[0]["changes"], at: moment(at) });

describe("settings in force", () => {
  it("V1 holds per field the newest value since the newest entry that carries a mode", () => {
    const changes = [
      settings("08:00", volumeControl),
      settings("09:00", { peepCmH2O: 12 }),
      settings("10:00", { fio2: 0.6 }),
    ];
    const now = inForce(changes, "10:30");
    expect(now.mode?.value).toBe("A/C-VC");
    expect(now.peepCmH2O?.value).toBe(12);
    expect(now.fio2).toMatchObject({ value: 0.6, entryId: changes[2]!.id, chartedAt: moment("10:00") });
    expect(now.tidalVolumeMl).toMatchObject({ value: 420, entryId: changes[0]!.id });
    expect(inForce(changes, "08:59").peepCmH2O?.value).toBe(10);
    expect(inForce(changes, "09:00").peepCmH2O?.value).toBe(12);
  });

  it("V1 begins anew at an entry with a mode, though the mode is unchanged", () => {
    const { flowLPerMin: _flow, ...withoutFlow } = volumeControl;
    const now = inForce([settings("08:00", volumeControl), settings("09:00", withoutFlow)], "09:00");
    expect(now.flowLPerMin).toBeUndefined();
  });

  it("V1 ignores fields that the mode does not use", () => {
    const now = inForce([settings("08:00", { ...volumeControl, pressureAbovePeepCmH2O: 14, tHighS: 4 })], "08:00");
    expect(now.pressureAbovePeepCmH2O).toBeUndefined();
    expect(now.tHighS).toBeUndefined();
  });

  it("V1 orders entries of one moment by when they were recorded, then by id as a number", () => {
    const early = fact("08:00", volumeControl);
    const later = fact("09:00", { peepCmH2O: 14 }, { recorded: "09:20", id: "9" });
    const first = fact("09:00", { peepCmH2O: 12 }, { recorded: "09:10", id: "10" });
    expect(inForce([early, later, first], "09:30").peepCmH2O?.value).toBe(14);
    const tie = fact("09:00", { peepCmH2O: 16 }, { recorded: "09:20", id: "10" });
    expect(inForce([tie, early, later], "09:30").peepCmH2O?.value).toBe(16);
  });

  it("V1 keeps a replacement at the original's moment in the original's place", () => {
    const original = { recordedAt: moment("09:00"), id: "5" };
    const replaced = { ...fact("09:00", { peepCmH2O: 11 }, { recorded: "11:00", id: "90" }), place: original };
    const second = fact("09:00", { peepCmH2O: 14 }, { recorded: "09:05", id: "6" });
    const changes = [fact("08:00", volumeControl), second, replaced];
    expect(inForce(changes, "12:00").peepCmH2O?.value).toBe(14);
  });

  it("V1 holds nothing before the first entry with a mode", () => {
    expect(inForce([settings("08:00", { peepCmH2O: 12 })], "09:00")).toEqual({ mode: null });
    expect(inForce([settings("08:00", volumeControl)], "07:59")).toEqual({ mode: null });
    expect(settingsInForce({ changes: [], at: moment("08:00") })).toEqual({ mode: null });
  });

  it("V1 judges SpO2, gases and total rate without settings, upper limits too; all else is unmeasured", () => {
    const facts = {
      settings: [],
      mechanics: [relaxed("08:30", 24, { respiratoryRateTotal: 40, exhaledTidalVolumeMl: 420 })],
      observations: [spo2("08:30", 99)],
      bloodGases: [gas("08:30", { ph: 7.2, pao2MmHg: 70, paco2MmHg: 60 })],
    };
    const { derived, group } = judge("08:40", { facts });
    expect(derived.spo2Percent.state).toBe("outside");
    expect(derived.ph.state).toBe("outside");
    expect(derived.respiratoryRateTotal.state).toBe("outside");
    expect(derived.pao2MmHg.state).toBe("inside");
    for (const name of ["vtMlPerKg", "plateauCmH2O", "drivingPressureCmH2O"] as const) {
      expect(derived[name]).toMatchObject({
        state: "unmeasured",
        value: null,
        freshness: "missing",
        notes: ["not-computable"],
      });
    }
    expect(derived.pfRatio).toMatchObject({ value: null, freshness: "missing" });
    expect(group).toBe("outside");
  });

  it("V1 takes the settings of the moment, not of now", () => {
    const facts = { settings: [settings("08:00", volumeControl), settings("10:00", { tidalVolumeMl: 600 })] };
    expect(metric("vtMlPerKg", "09:59", { facts }).state).toBe("inside");
    expect(metric("vtMlPerKg", "10:00", { facts }).state).toBe("outside");
  });
});
