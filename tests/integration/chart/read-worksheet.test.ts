import { beforeEach, describe, expect, it } from "vitest";
import { AuditEvent, ChartEntry, EpisodePause, TargetOrder, VentilationEpisode } from "@/db/models";
import { worksheetSchema, type ChartAnswer } from "@/lib/contracts";
import { targetsFromSet } from "@/lib/protocol";
import { buildEntry, buildSubmission } from "../factories";
import { Bedside, idOf, measuredOn, minutesAgo, volumeControl } from "./bedside";

let bedside: Bedside;

beforeEach(async () => {
  bedside = await Bedside.open();
});

const recordedAt = async (answer: ChartAnswer) =>
  (await ChartEntry.findByPk(idOf(answer), { rejectOnEmpty: true })).recordedAt.toISOString();

const measured = (plateauCmH2O: number, minutes: number) =>
  bedside.charted("bedside-entries", {
    mechanics: { plateauCmH2O, hold: "relaxed", totalPeepCmH2O: 10 },
    basedOn: measuredOn(volumeControl),
    chartedAt: minutesAgo(minutes),
  });

describe("a worksheet", () => {
  it("of a patient with nothing charted is whole, with nulls and what is due", async () => {
    const worksheet = await bedside.worksheet();
    expect(worksheetSchema.safeParse(worksheet).error).toBeUndefined();
    expect(worksheet).toMatchObject({
      patient: { id: bedside.patientId },
      episode: { id: bedside.episodeId, endedAt: null, pausedSince: null, pauses: [] },
      ...{ height: null, pbwKg: null, settings: null, settingsCheckedAt: null, mechanics: null, observations: null },
      targets: { origin: "default", plateauCmH2O: { max: 30 }, orderedBy: null },
      ...{ group: "unmeasured", nextSteps: [] },
    });
    expect(worksheet.due.map(({ what }) => what)).toContain("height");
    expect(worksheet).not.toHaveProperty("facts");
  });

  it("holds what was charted, what follows, and where each number came from", async () => {
    await bedside.settled();
    const answer = await measured(26, 1);
    const { derived } = await bedside.worksheet();
    expect(derived.vtMlPerKg).toMatchObject({ unit: "mL/kg", state: "inside" });
    expect(derived.vtMlPerKg?.value).toBeCloseTo(420 / 70.566, 6);
    expect(derived.drivingPressureCmH2O).toMatchObject({
      value: 16,
      state: "outside",
      limit: { max: 15, origin: "default" },
    });
    expect(derived.drivingPressureCmH2O?.inputs).toContainEqual(
      expect.objectContaining({ name: "plateauCmH2O", value: 26, entryId: idOf(answer) }),
    );
  });

  it("tells each role what it may do", async () => {
    expect((await bedside.worksheet({}, "nurse")).can).toMatchObject({
      ...{ settings: true, mechanics: false, observations: true, heights: true, "settings-checks": false },
      settingsFields: ["fio2"],
      ...{ correct: true, moveBed: false },
    });
    const { can } = await bedside.worksheet();
    expect(can).toMatchObject({ mechanics: true, "settings-checks": true, moveBed: true });
    expect(can.settingsFields).toContain("peepCmH2O");
  });

  it("with facts=1 carries the facts it was judged by", async () => {
    await bedside.settled();
    const { facts } = await bedside.worksheet({ facts: "1" });
    expect(facts?.settings).toMatchObject([{ mode: "A/C-VC", fio2: 0.5, author: { id: expect.any(String) } }]);
    expect(facts?.heights).toMatchObject([{ heightCm: 175 }]);
  });

  it("counts days by the unit's calendar and says since when it is paused", async () => {
    const { episodeId } = bedside;
    const pausedAt = new Date(minutesAgo(30));
    await EpisodePause.create({ episodeId, pausedAt, resumedAt: null });
    const { episode, group } = await bedside.worksheet();
    expect(episode.pausedSince).toBe(pausedAt.toISOString());
    expect(group).toBe("away");
    await VentilationEpisode.update(
      { intubatedAt: new Date(Date.now() - 72 * 3_600_000) },
      { where: { id: episodeId } },
    );
    expect((await bedside.worksheet()).episode.day).toBe(4);
  });

  it("is judged by the newest standing order, which says so", async () => {
    const { authorId, id: submissionId } = await buildSubmission();
    const entry = await buildEntry({ submissionId, authorId, episodeId: bedside.episodeId, kind: "targets" });
    const targets = { ...targetsFromSet("unit-default"), plateauCmH2O: { max: 28 } };
    await TargetOrder.create({ entryId: entry.id, targets, reason: null });
    await bedside.settled();
    await measured(29, 1);
    const worksheet = await bedside.worksheet();
    expect(worksheet.targets).toMatchObject({
      origin: "order",
      plateauCmH2O: { max: 28 },
      orderedBy: { id: authorId },
    });
    expect(worksheet.derived.plateauCmH2O).toMatchObject({ state: "outside", limit: { max: 28, origin: "order" } });
  });

  it("read again within a quarter of an hour leaves one audit row a person", async () => {
    await bedside.worksheet();
    await bedside.worksheet();
    await bedside.worksheet({}, "nurse");
    const reads = await AuditEvent.findAll({ where: { patientId: bedside.patientId, action: "worksheet.read" } });
    const people = [bedside.ward.people.therapist.id, bedside.ward.people.nurse.id];
    // One quarter of an hour may end between two of the reads.
    expect(new Set(reads.map(({ actorId }) => actorId))).toEqual(new Set(people));
    expect(reads.length).toBeLessThan(4);
  });
});

describe("at a past moment", () => {
  it("shows what was true then, late entries included", async () => {
    await bedside.settled(volumeControl, 300);
    await measured(34, 60);
    await bedside.charted("settings", { peepCmH2O: 12, basedOn: { peepCmH2O: 10 }, chartedAt: minutesAgo(120) });
    const then = await bedside.worksheet({ at: minutesAgo(180) });
    expect(then.settings?.peepCmH2O?.value).toBe(10);
    expect(then.mechanics).toBeNull();
    expect((await bedside.worksheet({ at: minutesAgo(90) })).settings?.peepCmH2O?.value).toBe(12);
  });
});

describe("as known at a past moment", () => {
  it("leaves out what was recorded since, and shows an entry before its correction", async () => {
    await bedside.settled();
    const wrong = await measured(37, 10);
    const knownAt = await recordedAt(wrong);
    const entry = { chartedAt: minutesAgo(10), plateauCmH2O: 27, hold: "relaxed" };
    await bedside.correct(idOf(wrong), { correction: "replace", entry });
    expect((await bedside.worksheet()).mechanics?.plateauCmH2O?.value).toBe(27);
    expect((await bedside.worksheet({ knownAt })).mechanics?.plateauCmH2O?.value).toBe(37);
  });

  it("shows a voided entry while it was not yet voided, and a void undoes nothing before it", async () => {
    await bedside.settled();
    const reading = await measured(27, 10);
    const strike = await bedside.correct(idOf(reading), { correction: "void" });
    const voidedAt = await recordedAt(strike.json as unknown as ChartAnswer);
    expect((await bedside.worksheet({ knownAt: voidedAt })).mechanics).toBeNull();
    expect((await bedside.worksheet({ knownAt: await recordedAt(reading) })).mechanics).not.toBeNull();
  });

  it("shows what was in force before a late entry came", async () => {
    const first = await bedside.settled(volumeControl, 180);
    const late = await bedside.charted("settings", {
      peepCmH2O: 12,
      basedOn: { peepCmH2O: 10 },
      chartedAt: minutesAgo(120),
    });
    const at = minutesAgo(60);
    expect((await bedside.worksheet({ at })).settings?.peepCmH2O?.value).toBe(12);
    expect((await bedside.worksheet({ at, knownAt: await recordedAt(first) })).settings?.peepCmH2O?.value).toBe(10);
    expect((await bedside.worksheet({ at, knownAt: await recordedAt(late) })).settings?.peepCmH2O?.value).toBe(12);
  });
});
