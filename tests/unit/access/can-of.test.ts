import { describe, expect, it } from "vitest";
import { canOf } from "@/lib/access/can-of";
import type { PatientRow } from "@/lib/access/granted";
import { canSchema } from "@/lib/contracts";

const row = (role: PatientRow["member"]["role"], more: Partial<PatientRow> = {}): PatientRow => ({
  unitId: "1",
  hospitalId: "1",
  unitName: "North",
  member: { role, lead: false },
  policy: { timeZone: "Europe/London", gasUnit: "mmHg", barometricPressureMmHg: 760, nursesSetVentilators: false },
  patientId: "7",
  episodeId: "9",
  intubatedAt: new Date(0),
  endedAt: null,
  pausedSince: null,
  bed: null,
  ...more,
});

describe("what a reader is told they may do", () => {
  it("is everything but ordering, for a therapist", () => {
    const can = canOf(row("therapist"));
    expect(can).toMatchObject({
      settings: true,
      "settings-checks": true,
      mechanics: true,
      observations: true,
      heights: true,
      correct: true,
      moveBed: true,
      endEpisode: true,
    });
    expect(can.settingsFields).toContain("peepCmH2O");
  });

  it("is FiO2, observations and height, for a nurse", () => {
    expect(canOf(row("nurse"))).toEqual({
      settings: true,
      settingsFields: ["fio2"],
      "settings-checks": false,
      mechanics: false,
      observations: true,
      heights: true,
      correct: true,
      moveBed: false,
      endEpisode: false,
    });
  });

  it("is correcting alone once the episode has ended", () => {
    const can = canOf(row("therapist", { endedAt: new Date(1) }));
    expect(can).toMatchObject({ settings: false, heights: false, moveBed: false, correct: true, settingsFields: [] });
  });

  it("answers its contract, field for field", () => {
    const can = canOf(row("intensivist"));
    expect(canSchema.parse(can)).toEqual(can);
  });
});
