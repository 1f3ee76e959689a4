import { describe, expect, it } from "vitest";
import { bedsideEntry, settingsCheck } from "@/components/record/entry-body";
import { bedsideEntryBodySchema, settingsCheckBodySchema } from "@/lib/contracts";
import { buildValues, filled, nothingInForce } from "./build-record";

const clientKey = "7f0f3c52-95a5-4f3e-8a30-5b6a1d0c7a11";
const entryOf = (values: Parameters<typeof buildValues>[0], from = filled) =>
  bedsideEntry(buildValues(values), from, { clientKey, reason: null });

describe("what a form charts", () => {
  it("charts the one setting that differs, and says which value it started from", () => {
    expect(entryOf({ settings: { peepCmH2O: "12" } })).toEqual({
      chartedAt: filled.chartedAt,
      clientKey,
      basedOn: { peepCmH2O: 10 },
      settings: { peepCmH2O: 12 },
    });
  });

  it("charts nothing where a value was typed that is in force already", () => {
    expect(entryOf({ settings: { peepCmH2O: "10", fio2: "60" } })).toBeNull();
  });

  it("says on which settings it measured", () => {
    const entry = entryOf({ mechanics: { plateauCmH2O: "27" }, hold: "relaxed" });
    expect(entry?.mechanics).toEqual({ plateauCmH2O: 27, hold: "relaxed" });
    expect(entry?.settings).toBeUndefined();
    expect(entry?.basedOn).toEqual({
      tidalVolumeMl: 420,
      pressureAbovePeepCmH2O: null,
      pressureSupportCmH2O: null,
      peepCmH2O: 10,
      mode: "A/C-VC",
    });
  });

  it("charts every setting of a new mode, so that the entry is complete", () => {
    const entry = entryOf({ mode: "A/C-PC", settings: { pressureAbovePeepCmH2O: "14" } });
    expect(entry?.settings).toEqual({
      mode: "A/C-PC",
      pressureAbovePeepCmH2O: 14,
      respiratoryRate: 24,
      peepCmH2O: 10,
      fio2: 0.6,
      inspiratoryTimeS: 0.8,
    });
    expect(entry?.basedOn).toMatchObject({ mode: "A/C-VC", pressureAbovePeepCmH2O: null });
  });

  it("starts from nothing where nothing is in force", () => {
    const settings = { tidalVolumeMl: "420", respiratoryRate: "24", peepCmH2O: "10", fio2: "0.6", flowLPerMin: "45" };
    const entry = entryOf({ mode: "A/C-VC", settings }, nothingInForce);
    expect(entry?.basedOn).toBeNull();
    expect(Object.keys(entry?.settings ?? {})).toHaveLength(6);
  });

  it("leaves out what is still refused", () => {
    expect(entryOf({ settings: { peepCmH2O: "60" } })).toBeNull();
  });

  it("sends bodies that the contract takes", () => {
    const entry = entryOf({
      settings: { fio2: "45" },
      mechanics: { plateauCmH2O: "27,5" },
      hold: "unsure",
      observations: { spo2Percent: "93" },
    });
    expect(bedsideEntryBodySchema.safeParse(entry).error).toBeUndefined();
    expect(settingsCheckBodySchema.safeParse(settingsCheck(filled, clientKey)).error).toBeUndefined();
  });

  it("confirms every setting in force with a check, and none where none is", () => {
    expect(Object.keys(settingsCheck(filled, clientKey)?.basedOn ?? {})).toEqual(
      expect.arrayContaining(["mode", "tidalVolumeMl", "peepCmH2O", "flowPattern"]),
    );
    expect(settingsCheck(nothingInForce, clientKey)).toBeNull();
  });
});
