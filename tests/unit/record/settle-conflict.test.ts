import { describe, expect, it } from "vitest";
import { bedsideEntry } from "@/components/record/entry-body";
import { settleConflict } from "@/components/record/settle-conflict";
import type { FieldConflict } from "@/lib/contracts";
import { buildValues, filled } from "./build-record";

const clientKey = "7f0f3c52-95a5-4f3e-8a30-5b6a1d0c7a11";
const meanwhile = (field: string, yours: FieldConflict["yours"], value: number | string): FieldConflict => ({
  field,
  yours,
  basedOn: filled.values[field] ?? null,
  inForce: { value, entryId: "700", chartedAt: "2026-12-01T14:18:00+01:00", author: { id: "9", name: "" } },
});
const entryOf = (settled: ReturnType<typeof settleConflict>) =>
  bedsideEntry(settled.values, settled.filled, { clientKey, reason: null });

describe("settling what two people charted at once", () => {
  const values = buildValues({ settings: { peepCmH2O: "12", respiratoryRate: "26" } });
  const conflict = [meanwhile("peepCmH2O", 12, 8)];

  it("charts mine from what now stands", () => {
    const entry = entryOf(settleConflict({ values, filled, conflict, choices: { peepCmH2O: "mine" } }));
    expect(entry?.settings).toEqual({ peepCmH2O: 12, respiratoryRate: 26 });
    expect(entry?.basedOn).toEqual({ peepCmH2O: 8, respiratoryRate: 24 });
  });

  it("leaves theirs, and charts nothing where all was theirs", () => {
    expect(entryOf(settleConflict({ values, filled, conflict, choices: { peepCmH2O: "theirs" } }))?.settings).toEqual({
      respiratoryRate: 26,
    });
    const one = buildValues({ settings: { peepCmH2O: "12" } });
    expect(entryOf(settleConflict({ values: one, filled, conflict, choices: { peepCmH2O: "theirs" } }))).toBeNull();
  });

  it("lets a reading count with what was set meanwhile", () => {
    const reading = buildValues({ mechanics: { plateauCmH2O: "27" }, hold: "relaxed" });
    const entry = entryOf(
      settleConflict({ values: reading, filled, conflict: [meanwhile("peepCmH2O", null, 12)], choices: {} }),
    );
    expect(entry?.basedOn).toMatchObject({ peepCmH2O: 12 });
    expect(entry?.settings).toBeUndefined();
  });

  it("lets go of settings that their mode does not use", () => {
    const volume = buildValues({ settings: { tidalVolumeMl: "400", peepCmH2O: "12" } });
    const modes = [meanwhile("mode", null, "A/C-PC")];
    const settled = settleConflict({ values: volume, filled, conflict: modes, choices: {} });
    expect(entryOf(settled)?.settings).toEqual({ peepCmH2O: 12 });
  });

  it("charts my mode whole where mine is to stand", () => {
    const mine = buildValues({ mode: "CSV-PS", settings: { pressureSupportCmH2O: "10" } });
    const modes = [meanwhile("mode", "CSV-PS", "A/C-PC")];
    const settled = settleConflict({ values: mine, filled, conflict: modes, choices: { mode: "mine" } });
    expect(entryOf(settled)?.settings).toEqual({
      mode: "CSV-PS",
      pressureSupportCmH2O: 10,
      peepCmH2O: 10,
      fio2: 0.6,
    });
  });
});
