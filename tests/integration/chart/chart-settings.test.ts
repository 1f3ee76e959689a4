import { randomUUID } from "node:crypto";
import { beforeEach, describe, expect, it } from "vitest";
import { AuditEvent, ChartEntry, SettingChange } from "@/db/models";
import { paths } from "../http/call";
import { Bedside, conflictOf, idOf, minutesAgo, pressureControl, shown, volumeControl } from "./bedside";

let bedside: Bedside;

beforeEach(async () => {
  bedside = await Bedside.open();
});

const rows = () => ChartEntry.count({ where: { episodeId: bedside.episodeId, kind: "settings" } });

describe("first settings", () => {
  it("without a mode are 422: choose the mode", async () => {
    const answer = await bedside.chart("settings", { peepCmH2O: 10, basedOn: null });
    expect(answer.status).toBe(422);
    expect(answer.json.errors).toEqual([
      { path: "mode", message: "No settings are in force at that time: choose the mode." },
    ]);
    expect(await rows()).toBe(0);
  });

  it("with a mode must be complete for it", async () => {
    const answer = await bedside.chart("settings", { mode: "A/C-VC", tidalVolumeMl: 420, basedOn: null });
    expect(answer.status).toBe(422);
    expect(paths(answer).sort()).toEqual(["fio2", "inspiratoryTimeS", "peepCmH2O", "respiratoryRate"]);
  });

  it("refuse what the mode does not use", async () => {
    const answer = await bedside.chart("settings", { ...volumeControl, pHighCmH2O: 25, basedOn: null });
    expect(answer.status).toBe(422);
    expect(paths(answer)).toEqual(["pHighCmH2O"]);
  });

  it("are stored as charted and stand on the worksheet, each with its entry, time and author", async () => {
    const chartedAt = minutesAgo(3);
    const answer = await bedside.charted("settings", { ...volumeControl, fio2: 0.57, basedOn: null, chartedAt });
    const [entry] = answer.entries;
    expect(answer.entries).toEqual([{ id: entry?.id, kind: "settings" }]);
    const row = await SettingChange.findByPk(entry?.id ?? "", { rejectOnEmpty: true });
    expect(row).toMatchObject({ mode: "A/C-VC", tidalVolumeMl: 420, fio2Percent: 57, flowLPerMin: null });
    const { settings } = await bedside.worksheet();
    expect(settings?.fio2).toEqual({
      value: 0.57,
      entryId: entry?.id,
      chartedAt,
      recordedAt: expect.any(String),
      author: { id: bedside.ward.people.therapist.id, name: bedside.ward.people.therapist.name },
    });
    expect(answer.worksheet.settings).toEqual(settings);
  });

  it("leave an audit row that names the person, the patient and the submission", async () => {
    const { submission, entries } = await bedside.charted("settings", { ...volumeControl, basedOn: null });
    const audit = await AuditEvent.findOne({ where: { submissionId: submission.id }, rejectOnEmpty: true });
    expect(audit).toMatchObject({
      actorId: bedside.ward.people.therapist.id,
      patientId: bedside.patientId,
      unitId: bedside.ward.unit.id,
      newValues: { entries },
    });
  });
});

describe("a change of settings", () => {
  it("holds only what was charted; the rest stays in force", async () => {
    await bedside.settled();
    const basedOn = shown(volumeControl, "peepCmH2O");
    const answer = await bedside.charted("settings", { peepCmH2O: 12, basedOn });
    const row = await SettingChange.findByPk(idOf(answer), { rejectOnEmpty: true });
    expect(row).toMatchObject({ mode: null, peepCmH2O: 12, tidalVolumeMl: null, fio2Percent: null });
    expect(answer.worksheet.settings).toMatchObject({
      peepCmH2O: { value: 12, entryId: row.entryId },
      tidalVolumeMl: { value: 420 },
    });
  });

  it("without any setting is 422", async () => {
    await bedside.settled();
    expect((await bedside.chart("settings", { basedOn: {} })).status).toBe(422);
  });

  it("of a field that the mode in force does not use is 422", async () => {
    await bedside.settled();
    const answer = await bedside.chart("settings", {
      pressureAbovePeepCmH2O: 14,
      basedOn: { pressureAbovePeepCmH2O: null },
    });
    expect(answer.status).toBe(422);
    expect(answer.json.errors).toEqual([
      { path: "pressureAbovePeepCmH2O", message: "A/C-VC does not use this setting." },
    ]);
  });

  it("V1 with a new mode begins anew: what the old mode used is no longer in force", async () => {
    await bedside.settled({ ...volumeControl, flowPattern: "square" });
    const basedOn = { ...shown(volumeControl, ...Object.keys(pressureControl)), pressureAbovePeepCmH2O: null };
    const { worksheet } = await bedside.charted("settings", { ...pressureControl, basedOn });
    expect(Object.keys(worksheet.settings ?? {}).sort()).toEqual(Object.keys(pressureControl).sort());
  });

  it("keeps four decimals and refuses five", async () => {
    await bedside.settled();
    const five = await bedside.chart("settings", { inspiratoryTimeS: 0.91234, basedOn: { inspiratoryTimeS: 0.9 } });
    expect(five.status).toBe(422);
    const { worksheet } = await bedside.charted("settings", {
      inspiratoryTimeS: 0.9123,
      basedOn: { inspiratoryTimeS: 0.9 },
    });
    expect(worksheet.settings?.inspiratoryTimeS?.value).toBe(0.9123);
  });
});

describe("when it was true", () => {
  const change = (chartedAt: string) => bedside.chart("settings", { ...volumeControl, basedOn: null, chartedAt });

  it("may be 24 h back and no more", async () => {
    expect((await change(minutesAgo(24 * 60 + 1))).status).toBe(422);
    expect((await change(minutesAgo(24 * 60 - 1))).status).toBe(201);
  });

  it("may be up to 5 min ahead, and is then stored as the server's now", async () => {
    const before = Date.now();
    const answer = await change(minutesAgo(-4.9));
    expect(answer.status).toBe(201);
    const entry = await ChartEntry.findOne({ where: { episodeId: bedside.episodeId }, rejectOnEmpty: true });
    expect(entry.chartedAt.getTime()).toBeGreaterThanOrEqual(before);
    expect(entry.chartedAt.getTime()).toBeLessThanOrEqual(Date.now());
  });

  it("more than 5 min ahead is 422", async () => {
    const answer = await change(minutesAgo(-5.1));
    expect(answer.status).toBe(422);
    expect(paths(answer)).toEqual(["chartedAt"]);
  });

  it("is never before intubation", async () => {
    bedside = await Bedside.open({ hoursIntubated: 2 });
    expect((await change(minutesAgo(121))).status).toBe(422);
    expect((await change(minutesAgo(119))).status).toBe(201);
  });

  it("keeps the offset of the clock it was read from", async () => {
    const at = new Date(Math.floor(Date.now() / 60_000) * 60_000 - 600_000);
    const wallClock = new Date(at.getTime() + 330 * 60_000).toISOString().slice(0, 19);
    await change(`${wallClock}+05:30`);
    const entry = await ChartEntry.findOne({ where: { episodeId: bedside.episodeId }, rejectOnEmpty: true });
    expect(entry).toMatchObject({ chartedAt: at, chartedOffsetMin: 330 });
    const { entries } = await bedside.history();
    expect(entries[0]?.chartedAt).toBe(`${wallClock}.000+05:30`);
  });
});

describe("basedOn", () => {
  it("must name every touched field", async () => {
    await bedside.settled();
    const answer = await bedside.chart("settings", { peepCmH2O: 12, fio2: 0.6, basedOn: { fio2: 0.5 } });
    expect(answer.status).toBe(422);
    expect(paths(answer)).toEqual(["basedOn.peepCmH2O"]);
  });

  it("ignores fields that the entry does not touch", async () => {
    await bedside.settled();
    const basedOn = { peepCmH2O: 10, fio2: 0.21, respiratoryRate: 99 };
    expect((await bedside.chart("settings", { peepCmH2O: 12, basedOn })).status).toBe(201);
  });

  it("null where something is in force is 409 with both", async () => {
    const first = await bedside.settled();
    const answer = await bedside.chart("settings", { peepCmH2O: 12, basedOn: null });
    expect(answer.status).toBe(409);
    expect(conflictOf(answer)).toEqual([
      {
        field: "peepCmH2O",
        yours: 12,
        basedOn: null,
        inForce: {
          value: 10,
          entryId: first.entries[0]?.id,
          chartedAt: expect.any(String),
          author: { id: bedside.ward.people.therapist.id, name: bedside.ward.people.therapist.name },
        },
      },
    ]);
    expect(await rows()).toBe(1);
  });

  it("a value that nobody charted is 409 with nothing in force", async () => {
    await bedside.settled();
    const answer = await bedside.chart("settings", { flowLPerMin: 60, basedOn: { flowLPerMin: 50 } });
    expect(conflictOf(answer)).toEqual([{ field: "flowLPerMin", yours: 60, basedOn: 50, inForce: null }]);
  });

  it("is compared by value: the same value charted again meanwhile is no conflict", async () => {
    await bedside.settled();
    await bedside.charted("settings", { peepCmH2O: 10, basedOn: { peepCmH2O: 10 }, chartedAt: minutesAgo(10) });
    expect((await bedside.chart("settings", { peepCmH2O: 12, basedOn: { peepCmH2O: 10 } })).status).toBe(201);
  });

  it("is compared with what was in force at chartedAt, so a late entry does not disturb now", async () => {
    await bedside.settled(volumeControl, 180);
    await bedside.charted("settings", { peepCmH2O: 14, basedOn: { peepCmH2O: 10 }, chartedAt: minutesAgo(60) });
    const late = await bedside.charted("settings", {
      peepCmH2O: 12,
      basedOn: { peepCmH2O: 10 },
      chartedAt: minutesAgo(120),
    });
    expect(late.worksheet.settings?.peepCmH2O?.value).toBe(14);
    const then = await bedside.worksheet({ at: minutesAgo(90) });
    expect(then.settings?.peepCmH2O).toMatchObject({ value: 12, entryId: late.entries[0]?.id });
  });

  it("of two who race one is 201, the other 409 with both values", async () => {
    await bedside.settled();
    const chartedAt = minutesAgo(1);
    const answers = await Promise.all(
      [12, 14].map((peepCmH2O) => bedside.chart("settings", { peepCmH2O, basedOn: { peepCmH2O: 10 }, chartedAt })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    const [won, lost] = answers.sort((one, other) => one.status - other.status);
    const conflict = lost && conflictOf(lost);
    const standing = won?.json.worksheet?.settings?.peepCmH2O?.value;
    expect(conflict).toMatchObject([{ field: "peepCmH2O", basedOn: 10, inForce: { value: standing } }]);
    expect(conflict?.[0]?.yours).not.toBe(standing);
    expect(await rows()).toBe(2);
  });
});

describe("one key", () => {
  it("six at once are one 201 and five 200 with the same ids, and one row", async () => {
    await bedside.settled();
    const body = { clientKey: randomUUID(), chartedAt: minutesAgo(0), peepCmH2O: 12, basedOn: { peepCmH2O: 10 } };
    const answers = await Promise.all(Array.from({ length: 6 }, () => bedside.chart("settings", body)));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 200, 200, 201]);
    const ids = answers.map(({ json }) => JSON.stringify([json.submission, json.entries]));
    expect(new Set(ids).size).toBe(1);
    expect(await rows()).toBe(2);
  });

  it("sent again later answers with the same ids and the worksheet as it is now", async () => {
    await bedside.settled();
    const body = { clientKey: randomUUID(), chartedAt: minutesAgo(5), peepCmH2O: 12, basedOn: { peepCmH2O: 10 } };
    const first = await bedside.charted("settings", body);
    await bedside.charted("settings", { peepCmH2O: 14, basedOn: { peepCmH2O: 12 } });
    const again = await bedside.chart("settings", body);
    expect(again.status).toBe(200);
    expect(again.json).toMatchObject({ submission: first.submission, entries: first.entries });
    expect(again.json.worksheet?.settings?.peepCmH2O?.value).toBe(14);
  });

  it("with another body is 409", async () => {
    await bedside.settled();
    const clientKey = randomUUID();
    await bedside.charted("settings", { clientKey, peepCmH2O: 12, basedOn: { peepCmH2O: 10 } });
    const other = await bedside.chart("settings", { clientKey, peepCmH2O: 13, basedOn: { peepCmH2O: 12 } });
    expect(other.status).toBe(409);
    expect(await rows()).toBe(2);
  });

  it("that was refused stays free for a mended body", async () => {
    await bedside.settled();
    const clientKey = randomUUID();
    expect((await bedside.chart("settings", { clientKey, pHighCmH2O: 25, basedOn: {} })).status).toBe(422);
    expect((await bedside.chart("settings", { clientKey, peepCmH2O: 12, basedOn: { peepCmH2O: 10 } })).status).toBe(
      201,
    );
  });
});

describe("out of the order", () => {
  it("a volume beyond the unit's default without a reason is 422 at reason", async () => {
    await bedside.settled();
    const change = { tidalVolumeMl: 600, basedOn: { tidalVolumeMl: 420 } };
    const refused = await bedside.chart("settings", change);
    expect(refused.status).toBe(422);
    expect(paths(refused)).toEqual(["reason"]);
    const answer = await bedside.charted("settings", { ...change, reason: "pH under 7.15" });
    const row = await SettingChange.findByPk(idOf(answer), { rejectOnEmpty: true });
    expect(row.reason).toBe("pH under 7.15");
    expect((await bedside.history()).entries[0]).toMatchObject({ reason: "pH under 7.15", correction: null });
  });

  it("back toward the order needs none", async () => {
    await bedside.settled();
    await bedside.charted("settings", { tidalVolumeMl: 640, basedOn: { tidalVolumeMl: 420 }, reason: "Asked" });
    expect((await bedside.chart("settings", { tidalVolumeMl: 600, basedOn: { tidalVolumeMl: 640 } })).status).toBe(201);
  });

  it("a pressure is judged in pressure control only", async () => {
    await bedside.settled(pressureControl);
    const answer = await bedside.chart("settings", { peepCmH2O: 17, basedOn: { peepCmH2O: 10 } });
    expect(paths(answer)).toEqual(["reason"]);
    const other = await Bedside.open();
    await other.settled();
    expect((await other.chart("settings", { peepCmH2O: 24, basedOn: { peepCmH2O: 10 } })).status).toBe(201);
  });
});

describe("a nurse", () => {
  it("charts FiO2", async () => {
    await bedside.settled();
    const answer = await bedside.chart("settings", { fio2: 0.6, basedOn: { fio2: 0.5 } }, { as: "nurse" });
    expect(answer.status).toBe(201);
    expect(answer.json.worksheet?.settings?.fio2).toMatchObject({ value: 0.6 });
  });

  it("charts nothing else, and is told which fields", async () => {
    await bedside.settled();
    const answer = await bedside.chart(
      "settings",
      { fio2: 0.6, peepCmH2O: 12, basedOn: { fio2: 0.5, peepCmH2O: 10 } },
      { as: "nurse" },
    );
    expect(answer.status).toBe(403);
    expect(paths(answer)).toEqual(["peepCmH2O"]);
    expect(await rows()).toBe(1);
  });
});
