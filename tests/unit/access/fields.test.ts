import { describe, expect, it } from "vitest";
import type { Member } from "@/lib/access/can";
import { refusedByCorrection } from "@/lib/access/corrections";
import { refusedFields, settingsFieldsFor } from "@/lib/access/fields";
import { settingsValuesSchema } from "@/lib/contracts";

const nurse: Member = { role: "nurse", lead: false };
const therapist: Member = { role: "therapist", lead: false };
const intensivist: Member = { role: "intensivist", lead: false };
const usual = { nursesSetVentilators: false };
const nursesSet = { nursesSetVentilators: true };
const everySetting = Object.keys(settingsValuesSchema.shape);

describe("the settings a role may chart", () => {
  it("are FiO2 alone for a nurse, and all where the unit says so", () => {
    expect(settingsFieldsFor(nurse, usual)).toEqual(["fio2"]);
    expect(settingsFieldsFor(nurse, nursesSet)).toEqual(everySetting);
  });

  it("are all for therapist and intensivist", () => {
    expect(settingsFieldsFor(therapist, usual)).toEqual(everySetting);
    expect(settingsFieldsFor(intensivist, usual)).toEqual(everySetting);
  });
});

describe("the fields of a body that a role may not send", () => {
  const refused = (who: Member, json: unknown, right: "settings:chart" | "bedside-entries:chart" = "settings:chart") =>
    refusedFields(who, right, usual, json);

  it("are all but fio2, chartedAt, clientKey, basedOn and reason in a nurse's settings", () => {
    const allowed = { fio2: 0.4, chartedAt: "", clientKey: "", basedOn: null, reason: "" };
    expect(refused(nurse, allowed)).toEqual([]);
    expect(refused(nurse, { ...allowed, mode: "A/C-VC", peepCmH2O: 10, source: "file" })).toEqual([
      "mode",
      "peepCmH2O",
      "source",
    ]);
  });

  it("are named even when they carry nothing", () => {
    expect(refused(nurse, { peepCmH2O: null })).toEqual(["peepCmH2O"]);
  });

  it("are none for those who may chart everything", () => {
    expect(refused(therapist, { mode: "A/C-VC", peepCmH2O: 10 })).toEqual([]);
  });

  it("are settings beyond FiO2 and all mechanics in a nurse's bedside entry, an empty part too", () => {
    const json = { settings: { fio2: 0.4, peepCmH2O: 10 }, mechanics: { plateauCmH2O: 27, hold: "relaxed" } };
    expect(refused(nurse, json, "bedside-entries:chart")).toEqual([
      "settings.peepCmH2O",
      "mechanics.plateauCmH2O",
      "mechanics.hold",
    ]);
    expect(refused(nurse, { mechanics: {} }, "bedside-entries:chart")).toEqual(["mechanics"]);
    expect(refused(nurse, { mechanics: null }, "bedside-entries:chart")).toEqual(["mechanics"]);
  });

  it("hide in no other shape of the part", () => {
    expect(refused(nurse, { settings: [{ peepCmH2O: 10 }] }, "bedside-entries:chart")).toEqual(["settings.0"]);
    expect(refused(nurse, { mechanics: "plateau 27" }, "bedside-entries:chart")).toEqual(["mechanics"]);
  });

  it("are cuff pressure's company in a nurse's airway check", () => {
    const json = { cuffCmH2O: 25, chartedAt: "", clientKey: "", tubeDepthCm: 22 };
    expect(refusedFields(nurse, "airway-checks:chart", usual, json)).toEqual(["tubeDepthCm"]);
    expect(refusedFields(therapist, "airway-checks:chart", usual, json)).toEqual([]);
  });

  it("are none of what is no object: the schema refuses that", () => {
    for (const json of [null, undefined, 7, "fio2"]) expect(refused(nurse, json)).toEqual([]);
  });
});

describe("what stands against a correction", () => {
  const fio2Alone = { kind: "settings", charted: ["fio2"] } as const;
  const more = { kind: "settings", charted: ["fio2", "peepCmH2O"] } as const;

  it("is nothing for an intensivist, whatever the entry", () => {
    for (const kind of ["settings", "settings-checks", "mechanics", "observations", "heights"] as const) {
      expect(refusedByCorrection(intensivist, usual, { kind, charted: ["plateauCmH2O"] })).toEqual([]);
    }
  });

  it("is the kind, where a nurse may not chart it", () => {
    expect(refusedByCorrection(nurse, usual, { kind: "mechanics", charted: [] })).toEqual(["kind"]);
    expect(refusedByCorrection(nurse, usual, { kind: "settings-checks", charted: [] })).toEqual(["kind"]);
    expect(refusedByCorrection(nurse, nursesSet, { kind: "settings-checks", charted: [] })).toEqual([]);
    expect(refusedByCorrection(nurse, usual, { kind: "observations", charted: ["spo2Percent"] })).toEqual([]);
  });

  it("is for a nurse every setting but FiO2, in the entry and in its replacement", () => {
    expect(refusedByCorrection(nurse, usual, fio2Alone)).toEqual([]);
    expect(refusedByCorrection(nurse, usual, { ...fio2Alone, entry: { fio2: 0.4, chartedAt: "" } })).toEqual([]);
    expect(refusedByCorrection(nurse, usual, more)).toEqual(["peepCmH2O"]);
    expect(refusedByCorrection(nurse, usual, { ...more, entry: { mode: "A/C-VC" } })).toEqual([
      "peepCmH2O",
      "entry.mode",
    ]);
    expect(refusedByCorrection(nurse, nursesSet, { ...more, entry: { mode: "A/C-VC" } })).toEqual([]);
  });
});
