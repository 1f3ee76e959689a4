import { describe, expect, it } from "vitest";
import { readinessOf, towardOrder } from "@/components/record/readiness";
import type { Targets } from "@/lib/protocol/targets";
import { buildValues, filled, nothingInForce } from "./build-record";

const targets: Targets = {
  origin: "order",
  conditions: [],
  vtMlPerKg: { min: 5, max: 7 },
  plateauCmH2O: { max: 30 },
  drivingPressureCmH2O: { max: 15 },
  spo2Percent: { min: 88, max: 95 },
  respiratoryRate: { max: 35 },
};
/** PBW of a man of 175 cm. Source: reference vector 01-pbw-003. */
const judged = { targets, pbwKg: 70.566, tidalVolumeStepMl: 10 };
const check = (values: Parameters<typeof buildValues>[0], from = filled) =>
  readinessOf(buildValues(values), from, judged);
const asked = (values: Parameters<typeof buildValues>[0]) => check(values).asks.map(({ key }) => key);

describe("what stands in the way of saving", () => {
  it("is that nothing was put in", () => {
    expect(check({}).blocker).toBe("Nothing has been changed or measured yet.");
  });

  it("is the word for the hold, and 'not sure' is enough", () => {
    expect(check({ mechanics: { plateauCmH2O: "27" } }).blocker).toBe("Say how the hold was.");
    expect(check({ mechanics: { plateauCmH2O: "27" }, hold: "unsure" }).blocker).toBeNull();
  });

  it("is why, where the hold was not possible", () => {
    expect(check({ hold: "not-possible" }).blocker).toBe("Say why the hold was not possible.");
    expect(check({ hold: "not-possible", holdReason: "coughing" }).blocker).toBeNull();
  });

  it("is the plateau, where only the hold's word was chosen", () => {
    expect(check({ hold: "relaxed" }).blocker).toBe("Enter the plateau that the hold showed.");
  });

  it("is the mode, where nothing is in force", () => {
    expect(check({}, nothingInForce).blocker).toBe("Choose the mode first.");
    expect(check({ mode: "A/C-PC" }, nothingInForce).blocker).toBe("A/C-PC needs Pressure above PEEP.");
  });
});

describe("what is refused, each by a sentence", () => {
  const refusals = (values: Parameters<typeof buildValues>[0]) => check(values).refusals;

  it("refuses what cannot be or slipped a unit", () => {
    expect(refusals({ settings: { tidalVolumeMl: "0.42" } })["settings.tidalVolumeMl"]).toBe(
      "Tidal volume 0.42 is outside what can be charted: enter 20 to 2000 mL.",
    );
    expect(refusals({ settings: { fio2: "15" } })["settings.fio2"]).toContain("neither a fraction nor a percentage");
  });

  it("refuses total PEEP more than 2 below the set PEEP, and takes 2", () => {
    expect(refusals({ mechanics: { totalPeepCmH2O: "7" } })["mechanics.totalPeepCmH2O"]).toContain("more than 2 below");
    expect(refusals({ mechanics: { totalPeepCmH2O: "8" } })).toEqual({});
  });

  it("refuses a plateau more than 2 above peak, and takes 2", () => {
    const pair = (plateau: string) => ({ mechanics: { plateauCmH2O: plateau, peakCmH2O: "24" } });
    expect(refusals(pair("26.5"))["mechanics.plateauCmH2O"]).toContain("more than 2 above peak");
    expect(refusals(pair("26"))).toEqual({});
  });

  it("refuses a plateau at total PEEP, or at the set PEEP where none was measured", () => {
    expect(refusals({ mechanics: { plateauCmH2O: "12", totalPeepCmH2O: "12" } })["mechanics.plateauCmH2O"]).toContain(
      "not above total PEEP",
    );
    expect(refusals({ mechanics: { plateauCmH2O: "10" } })["mechanics.plateauCmH2O"]).toContain(
      "not above the set PEEP",
    );
  });
});

describe("what is asked with one more tap", () => {
  it("asks about an unusual PEEP, and not again once answered", () => {
    expect(asked({ settings: { peepCmH2O: "26" } })).toEqual(["peepCmH2O=26"]);
    expect(asked({ settings: { peepCmH2O: "26" }, confirmed: ["peepCmH2O=26"] })).toEqual([]);
    expect(asked({ settings: { peepCmH2O: "27" }, confirmed: ["peepCmH2O=26"] })).toEqual(["peepCmH2O=27"]);
  });

  it("is silent where a target covers the field", () => {
    expect(asked({ mechanics: { plateauCmH2O: "36" }, hold: "relaxed", settings: { peepCmH2O: "22" } })).toEqual([]);
    expect(asked({ settings: { tidalVolumeMl: "140" } })).toEqual([]);
    expect(asked({ settings: { respiratoryRate: "40" } })).toEqual([]);
  });

  it("asks beyond 1.5 times a limit though a target covers the field", () => {
    expect(asked({ mechanics: { plateauCmH2O: "46" }, hold: "relaxed" })).toContain("plateauCmH2O=46");
    expect(asked({ mechanics: { plateauCmH2O: "33" }, hold: "relaxed" })).toEqual(["drivingPressureCmH2O=23"]);
    expect(asked({ mechanics: { plateauCmH2O: "32.5" }, hold: "relaxed" })).toEqual([]);
    expect(asked({ settings: { tidalVolumeMl: "750" } })).toEqual(["tidalVolumeMl=750"]);
  });

  it("asks about SpO2 under 60", () => {
    expect(asked({ observations: { spo2Percent: "59" } })).toEqual(["spo2Percent=59"]);
    expect(asked({ observations: { spo2Percent: "60" } })).toEqual([]);
  });

  it("asks about stacked breaths above 1.3 times the set volume until answered either way", () => {
    expect(asked({ mechanics: { exhaledTidalVolumeMl: "547" } })).toEqual(["stacked"]);
    expect(asked({ mechanics: { exhaledTidalVolumeMl: "546" } })).toEqual([]);
    expect(asked({ mechanics: { exhaledTidalVolumeMl: "547" }, breathStacking: false })).toEqual([]);
  });

  it("asks about total PEEP up to 2 below set, and a plateau up to 2 above peak", () => {
    expect(asked({ mechanics: { totalPeepCmH2O: "8" } })).toEqual(["trapped=8/10"]);
    expect(asked({ mechanics: { plateauCmH2O: "25", peakCmH2O: "24" }, hold: "relaxed" })).toEqual(["abovePeak=25/24"]);
  });
});

describe("reasons", () => {
  it("asks one for a volume beyond the order, and none for a bad measurement or another rate", () => {
    expect(check({ settings: { tidalVolumeMl: "520" } }).blocker).toBe("Pick a reason.");
    expect(check({ settings: { tidalVolumeMl: "520" }, reason: "Breath stacking" })).toMatchObject({
      blocker: null,
      reason: "Breath stacking",
    });
    expect(
      check({ mechanics: { plateauCmH2O: "35" }, hold: "relaxed", confirmed: ["drivingPressureCmH2O=25"] }),
    ).toMatchObject({
      blocker: null,
      reason: null,
    });
    expect(check({ settings: { respiratoryRate: "40" } })).toMatchObject({ blocker: null, reason: null });
  });

  it("fills itself where the setting moves toward the order", () => {
    const outside = { ...filled, values: { ...filled.values, tidalVolumeMl: 640 } };
    expect(check({ settings: { tidalVolumeMl: "560" } }, outside)).toMatchObject({
      blocker: null,
      reason: towardOrder,
    });
  });

  it("judges pressure above PEEP in pressure control", () => {
    const pressureControl = { settings: { pressureAbovePeepCmH2O: "18" }, mode: "A/C-PC" as const };
    expect(check(pressureControl).departures.map(({ metric }) => metric)).toEqual(["drivingPressureCmH2O"]);
  });
});
