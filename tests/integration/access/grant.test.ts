import { beforeAll, describe, expect, it } from "vitest";
import { BedStay, EpisodePause, UnitPolicy } from "@/db/models";
import type { Actor } from "@/lib/access/context";
import { grant } from "@/lib/access/grant";
import type { PatientRow } from "@/lib/access/granted";
import type { Right } from "@/lib/access/rights";
import { targetsFromSet } from "@/lib/protocol/starting-sets";
import { buildBed, buildEpisode, buildUnit } from "../factories";

const DAY_MS = 24 * 3_600_000;
const now = new Date();
const before = (ms: number) => new Date(now.getTime() - ms);

let unitId: string;
let otherUnitId: string;

beforeAll(async () => {
  unitId = (await buildUnit({}, { timeZone: "America/Denver", gasUnit: "kPa", barometricPressureMmHg: 630 })).id;
  otherUnitId = (await buildUnit()).id;
});

const actor = (role: "therapist" | "nurse", lead = false): Actor => ({
  userId: "1",
  name: "Person",
  email: "person@example.test",
  sessionId: "",
  memberships: [{ unitId, role, lead }],
  administersHospitalIds: [],
});

function patient(patientId: string, asking = actor("therapist"), right: Right = "patients:read") {
  const named = { params: { patientId }, json: async () => undefined };
  return grant(right, { actor: asking, now }, named) as Promise<PatientRow>;
}

const ended = (ago: number) => ({
  intubatedAt: before(ago + 5 * DAY_MS),
  endedAt: before(ago),
  endReason: "liberation" as const,
});

describe("a granted patient", () => {
  it("carries episode, unit, the person's part in it, the policy in force, pause and bed", async () => {
    const episode = await buildEpisode({ unitId });
    const bed = await buildBed({ unitId });
    await BedStay.create({ episodeId: episode.id, bedId: bed.id, during: [before(3_600_000), null] });
    await EpisodePause.create({ episodeId: episode.id, pausedAt: before(60_000), resumedAt: null });
    expect(await patient(episode.patientId, actor("nurse", true))).toEqual({
      unitId,
      hospitalId: expect.any(String) as string,
      unitName: expect.any(String) as string,
      member: { role: "nurse", lead: true },
      policy: {
        timeZone: "America/Denver",
        gasUnit: "kPa",
        barometricPressureMmHg: 630,
        nursesSetVentilators: false,
      },
      patientId: episode.patientId,
      episodeId: episode.id,
      intubatedAt: episode.intubatedAt,
      endedAt: null,
      pausedSince: before(60_000),
      bed: { id: bed.id, label: bed.label },
    });
  });

  it("has no bed once moved out of it, and is not paused once resumed", async () => {
    const episode = await buildEpisode({ unitId });
    const bed = await buildBed({ unitId });
    await BedStay.create({ episodeId: episode.id, bedId: bed.id, during: [before(3_600_000), before(60_000)] });
    await EpisodePause.create({ episodeId: episode.id, pausedAt: before(120_000), resumedAt: before(60_000) });
    expect(await patient(episode.patientId)).toMatchObject({ bed: null, pausedSince: null });
  });

  it("comes with the newest policy of the unit", async () => {
    const unit = await buildUnit();
    const episode = await buildEpisode({ unitId: unit.id });
    await UnitPolicy.create({
      unitId: unit.id,
      timeZone: "Europe/London",
      barometricPressureMmHg: 760,
      gasUnit: "mmHg",
      defaultTargets: targetsFromSet("unit-default"),
      nursesSetVentilators: true,
    });
    const nurse = { ...actor("nurse"), memberships: [{ unitId: unit.id, role: "nurse" as const, lead: false }] };
    const row = await patient(episode.patientId, nurse, "settings-checks:chart");
    expect(row.policy.nursesSetVentilators).toBe(true);
  });

  it("is the open episode, not an earlier one", async () => {
    const earlier = await buildEpisode({ unitId, ...ended(2 * DAY_MS) });
    const open = await buildEpisode({ unitId, patientId: earlier.patientId });
    expect((await patient(earlier.patientId)).episodeId).toBe(open.id);
  });
});

describe("an ended episode", () => {
  it("stays with its unit for seven days", async () => {
    const { patientId } = await buildEpisode({ unitId, ...ended(7 * DAY_MS - 60_000) });
    expect((await patient(patientId)).endedAt).not.toBeNull();
  });

  it("is then found by the unit's lead alone", async () => {
    const { patientId } = await buildEpisode({ unitId, ...ended(7 * DAY_MS + 60_000) });
    await expect(patient(patientId)).rejects.toMatchObject({ kind: "not-found" });
    await expect(patient(patientId, actor("nurse", true))).resolves.toMatchObject({ patientId });
  });

  it("is what its unit sees of a patient who now lies elsewhere", async () => {
    const mine = await buildEpisode({ unitId, ...ended(DAY_MS) });
    await buildEpisode({ unitId: otherUnitId, patientId: mine.patientId });
    expect((await patient(mine.patientId)).episodeId).toBe(mine.id);
  });
});

describe("what is refused", () => {
  it("answers a patient of another unit, a missing one and a person of no unit alike", async () => {
    const foreign = await buildEpisode({ unitId: otherUnitId });
    const nobody = { ...actor("therapist"), memberships: [] };
    const own = await buildEpisode({ unitId });
    const errors = await Promise.all(
      [patient(foreign.patientId), patient("999999999"), patient(own.patientId, nobody)].map((asked) =>
        asked.then(
          () => "granted",
          (error: Error) => error.message,
        ),
      ),
    );
    expect(new Set(errors)).toEqual(new Set(["Nothing is found at this address."]));
  });

  it("is forbidden, not missing, where the patient may be seen", async () => {
    const { patientId } = await buildEpisode({ unitId });
    await expect(patient(patientId, actor("nurse"), "mechanics:chart")).rejects.toMatchObject({ kind: "forbidden" });
    await expect(patient(patientId, actor("therapist"), "targets:order")).rejects.toMatchObject({ kind: "forbidden" });
  });

  it("is what only a lead may, to everyone else", async () => {
    const unit = (asking: Actor) =>
      grant("hours-inside:read", { actor: asking, now }, { params: { unitId }, json: async () => undefined });
    await expect(unit(actor("therapist"))).rejects.toMatchObject({ kind: "forbidden" });
    await expect(unit(actor("nurse", true))).resolves.toMatchObject({ unitId });
  });

  it("is the hospital's administration, to those who do not run it", async () => {
    const audit = (asking: Actor) =>
      grant("audit:read", { actor: asking, now }, { params: {}, json: async () => undefined });
    await expect(audit(actor("therapist", true))).rejects.toMatchObject({ kind: "forbidden" });
    await expect(audit({ ...actor("nurse"), administersHospitalIds: ["5"] })).resolves.toEqual({ hospitalIds: ["5"] });
  });
});
