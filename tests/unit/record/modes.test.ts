import { describe, expect, it } from "vitest";
import { bedsideEntry } from "@/components/record/entry-body";
import { limitsFieldOf, openMechanicsOf, settingRowsOf } from "@/components/record/form-fields";
import { readinessOf } from "@/components/record/readiness";
import { bedsideEntryBodySchema, settingsIssues } from "@/lib/contracts";
import { chartedRanges, fieldsOfMode, ventilationModes } from "@/lib/physiology";
import { buildValues, nothingInForce } from "./build-record";

const clientKey = "7f0f3c52-95a5-4f3e-8a30-5b6a1d0c7a11";
const judged = { targets: { origin: "default", conditions: [] } as const, pbwKg: null, tidalVolumeStepMl: 10 };
const usual = (field: keyof typeof chartedRanges) => {
  const { min, max } = chartedRanges[field].ask;
  return field === "fio2" ? "0.4" : String(Math.round((min + max) / 2));
};

describe.each(ventilationModes)("the form in %s", (mode) => {
  const rows = settingRowsOf(mode);

  it("shows settings of the mode and no others", () => {
    const used = fieldsOfMode(mode);
    expect(rows.length).toBeGreaterThan(1);
    expect(rows.every((field) => used.has(field))).toBe(true);
  });

  it("charts a first entry that is complete, from its own rows alone", () => {
    const settings = Object.fromEntries(rows.map((field) => [field, usual(limitsFieldOf(field, mode))]));
    const values = buildValues({ mode, settings });
    const entry = bedsideEntry(values, nothingInForce, { clientKey, reason: null });
    expect(bedsideEntryBodySchema.safeParse(entry).error).toBeUndefined();
    expect(settingsIssues(entry?.settings ?? {}, mode, true)).toEqual([]);
    expect(readinessOf(values, nothingInForce, judged).blocker).toBeNull();
  });

  it("asks no plateau where none can be held", () => {
    const holds = !["HFOV", "HFNO", "NIV"].includes(mode);
    expect(openMechanicsOf(mode).includes("plateauCmH2O")).toBe(holds);
  });
});
