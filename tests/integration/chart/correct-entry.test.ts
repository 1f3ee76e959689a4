import { randomUUID } from "node:crypto";
import { beforeEach, describe, expect, it } from "vitest";
import { ChartEntry, MechanicsReading, SettingChange } from "@/db/models";
import type { ChartAnswer } from "@/lib/contracts";
import { paths, type Answered } from "../http/call";
import { Bedside, conflictOf, idOf, minutesAgo, pressureControl, shown, volumeControl } from "./bedside";

let bedside: Bedside;

beforeEach(async () => {
  bedside = await Bedside.open();
});

const filed = (answer: Answered) => {
  if (answer.status !== 201) throw new Error(`answered ${answer.status}: ${JSON.stringify(answer.json)}`);
  return answer.json as unknown as ChartAnswer;
};

const reading = (plateauCmH2O: number, minutes = 10) =>
  bedside.charted("mechanics", { plateauCmH2O, hold: "relaxed", totalPeepCmH2O: 10, chartedAt: minutesAgo(minutes) });

const replaceWith = (plateauCmH2O: number, chartedAt: string) => ({
  correction: "replace",
  entry: { chartedAt, plateauCmH2O, hold: "relaxed" },
});

describe("replacing an entry", () => {
  it("puts the new one in its place; the old one stays readable with who and why", async () => {
    await bedside.settled();
    const wrong = idOf(await reading(37));
    const chartedAt = (await ChartEntry.findByPk(wrong, { rejectOnEmpty: true })).chartedAt.toISOString();
    const answer = filed(await bedside.correct(wrong, replaceWith(27, chartedAt)));
    const right = idOf(answer);
    expect(answer.entries).toEqual([{ id: right, kind: "mechanics" }]);
    expect(answer.worksheet.mechanics?.plateauCmH2O).toMatchObject({ value: 27, entryId: right });
    const row = await ChartEntry.findByPk(right, { rejectOnEmpty: true });
    expect(row).toMatchObject({ supersedesId: wrong, correction: "replace", reason: "Wrong reading" });
    const { entries } = await bedside.history({ kind: "mechanics" });
    expect(entries.map(({ id }) => id)).toEqual([right, wrong]);
    expect(entries[0]).toMatchObject({
      correction: "replace",
      supersedesId: wrong,
      supersededById: null,
      reason: "Wrong reading",
    });
    expect(entries[1]).toMatchObject({ correction: null, supersededById: right, body: { plateauCmH2O: 37 } });
  });

  it("charts only what the replacement holds: what it omits is gone", async () => {
    const wrong = idOf(await reading(37));
    const { worksheet, entries } = filed(await bedside.correct(wrong, replaceWith(27, minutesAgo(10))));
    expect(worksheet.mechanics).not.toHaveProperty("totalPeepCmH2O");
    const row = await MechanicsReading.findByPk(entries[0]?.id ?? "", { rejectOnEmpty: true });
    expect(row).toMatchObject({ plateauCmH2O: 27, totalPeepCmH2O: null });
  });

  it("is validated as that kind's whole body, with paths inside entry", async () => {
    const wrong = idOf(await reading(27));
    const entry = { chartedAt: minutesAgo(10), plateauCmH2O: 270, clientKey: randomUUID() };
    const answer = await bedside.correct(wrong, { correction: "replace", entry });
    expect(answer.status).toBe(422);
    expect(paths(answer)).toContain("entry.plateauCmH2O");
    expect(await ChartEntry.count({ where: { supersedesId: wrong } })).toBe(0);
  });

  it("needs a reason and the entry; a void takes no entry", async () => {
    const wrong = idOf(await reading(27));
    expect(paths(await bedside.correct(wrong, { ...replaceWith(26, minutesAgo(10)), reason: " " }))).toEqual([
      "reason",
    ]);
    expect(paths(await bedside.correct(wrong, { correction: "replace" }))).toEqual(["entry"]);
    expect(paths(await bedside.correct(wrong, { ...replaceWith(26, minutesAgo(10)), correction: "void" }))).toEqual([
      "entry",
    ]);
  });

  it("may keep the original's time however old, and no other time beyond 24 h", async () => {
    bedside = await Bedside.open({ hoursIntubated: 100 });
    const old = new Date(Date.now() - 60 * 3_600_000);
    const wrong = idOf(await reading(37));
    const { episodeId } = bedside;
    // As a seed would: an entry of 60 h ago, which nobody could chart anew today.
    const { submissionId, authorId } = await ChartEntry.findByPk(wrong, { rejectOnEmpty: true });
    const entry = await ChartEntry.create({
      ...{ submissionId, authorId, episodeId, kind: "observations", chartedAt: old, chartedOffsetMin: 0 },
      ...{ supersedesId: null, correction: null, reason: null },
    });
    const body = (chartedAt: string) => ({ correction: "replace", entry: { chartedAt, spo2Percent: 90 } });
    const moved = await bedside.correct(entry.id, body(new Date(old.getTime() + 60_000).toISOString()));
    expect(paths(moved)).toEqual(["entry.chartedAt"]);
    const answer = filed(await bedside.correct(entry.id, body(old.toISOString())));
    const row = await ChartEntry.findByPk(idOf(answer), { rejectOnEmpty: true });
    expect(row.chartedAt).toEqual(old);
  });

  it("judges a reading by the set PEEP of its own time", async () => {
    await bedside.settled();
    const wrong = idOf(await reading(27));
    const entry = { chartedAt: minutesAgo(10), totalPeepCmH2O: 7 };
    expect(paths(await bedside.correct(wrong, { correction: "replace", entry }))).toEqual(["entry.totalPeepCmH2O"]);
  });
});

describe("replacing settings", () => {
  it("that carry a mode takes a mode, complete", async () => {
    const first = idOf(await bedside.settled(), "settings");
    const chartedAt = minutesAgo(60);
    const without = await bedside.correct(first, { correction: "replace", entry: { chartedAt, peepCmH2O: 8 } });
    expect(paths(without)).toEqual(["entry.mode"]);
    const partial = await bedside.correct(first, {
      correction: "replace",
      entry: { chartedAt, mode: "CPAP", peepCmH2O: 8 },
    });
    expect(paths(partial)).toEqual(["entry.fio2"]);
    const whole = await bedside.correct(first, {
      correction: "replace",
      entry: { chartedAt, ...volumeControl, peepCmH2O: 8 },
    });
    expect(filed(whole).worksheet.settings?.peepCmH2O?.value).toBe(8);
  });

  it("without a mode is held to the mode in force at its time", async () => {
    await bedside.settled();
    const change = idOf(
      await bedside.charted("settings", { peepCmH2O: 12, basedOn: { peepCmH2O: 10 }, chartedAt: minutesAgo(5) }),
    );
    const entry = { chartedAt: minutesAgo(5), pressureAbovePeepCmH2O: 14 };
    expect(paths(await bedside.correct(change, { correction: "replace", entry }))).toEqual([
      "entry.pressureAbovePeepCmH2O",
    ]);
    const moved = { chartedAt: minutesAgo(90), peepCmH2O: 12 };
    expect(paths(await bedside.correct(change, { correction: "replace", entry: moved }))).toEqual(["entry.mode"]);
  });

  it("needs no basedOn, and refuses one", async () => {
    await bedside.settled();
    const change = idOf(await bedside.charted("settings", { peepCmH2O: 12, basedOn: { peepCmH2O: 10 } }));
    const entry = { chartedAt: minutesAgo(1), peepCmH2O: 11, basedOn: { peepCmH2O: 12 } };
    expect(paths(await bedside.correct(change, { correction: "replace", entry }))).toEqual(["entry.basedOn"]);
  });

  it("V1 at the same time keeps the original's place: a later entry of the same minute still stands", async () => {
    await bedside.settled();
    const chartedAt = minutesAgo(5);
    const first = await bedside.charted("settings", {
      peepCmH2O: 12,
      fio2: 0.6,
      basedOn: { peepCmH2O: 10, fio2: 0.5 },
      chartedAt,
    });
    await bedside.charted("settings", { peepCmH2O: 14, basedOn: { peepCmH2O: 12 }, chartedAt });
    const entry = { chartedAt, peepCmH2O: 11, fio2: 0.7 };
    const { worksheet } = filed(await bedside.correct(idOf(first), { correction: "replace", entry }));
    expect(worksheet.settings).toMatchObject({ peepCmH2O: { value: 14 }, fio2: { value: 0.7 } });
  });
});

describe("voiding an entry", () => {
  it("strikes it: the one before stands again, and the void is readable with its reason", async () => {
    await bedside.settled();
    await reading(27, 20);
    const wrong = idOf(await reading(37));
    const answer = filed(await bedside.correct(wrong, { correction: "void", reason: "Wrong patient" }));
    expect(answer.worksheet.mechanics?.plateauCmH2O?.value).toBe(27);
    expect(await MechanicsReading.count({ where: { entryId: idOf(answer) } })).toBe(0);
    const { entries } = await bedside.history({ field: "plateauCmH2O" });
    expect(entries[0]).toMatchObject({
      id: idOf(answer),
      correction: "void",
      supersedesId: wrong,
      body: null,
      reason: "Wrong patient",
    });
    expect(entries[1]).toMatchObject({ id: wrong, supersededById: idOf(answer) });
  });

  it("is final: neither the void nor what it struck is corrected again", async () => {
    const wrong = idOf(await reading(37));
    const strike = idOf(filed(await bedside.correct(wrong, { correction: "void" })));
    for (const id of [wrong, strike]) {
      expect((await bedside.correct(id, replaceWith(27, minutesAgo(10)))).status).toBe(409);
      expect((await bedside.correct(id, { correction: "void" })).status).toBe(409);
    }
    expect(await ChartEntry.count({ where: { episodeId: bedside.episodeId } })).toBe(2);
  });

  it("V1 of the only settings with a mode leaves none: mode is null, and results are not computable", async () => {
    const first = idOf(await bedside.settled(), "settings");
    await reading(27);
    const { worksheet } = filed(await bedside.correct(first, { correction: "void" }));
    expect(worksheet.settings).toBeNull();
    expect(worksheet.derived.staticComplianceMlPerCmH2O).toMatchObject({ value: null, freshness: "missing" });
    expect(worksheet.derived.staticComplianceMlPerCmH2O?.notes).toContain("not-computable");
  });

  it("V1 of settings with a mode lets the fold start at the next older ones", async () => {
    await bedside.settled();
    const basedOn = { ...shown(volumeControl, ...Object.keys(pressureControl)), pressureAbovePeepCmH2O: null };
    const change = idOf(await bedside.charted("settings", { ...pressureControl, basedOn }));
    const { worksheet } = filed(await bedside.correct(change, { correction: "void" }));
    expect(worksheet.settings).toMatchObject({ mode: { value: "A/C-VC" }, tidalVolumeMl: { value: 420 } });
    expect(worksheet.settings).not.toHaveProperty("pressureAbovePeepCmH2O");
  });
});

describe("chains", () => {
  it("a correction may be corrected, and then voided", async () => {
    const first = idOf(await reading(37));
    const second = idOf(filed(await bedside.correct(first, replaceWith(28, minutesAgo(10)))));
    const third = idOf(filed(await bedside.correct(second, replaceWith(27, minutesAgo(10)))));
    expect((await bedside.worksheet()).mechanics?.plateauCmH2O).toMatchObject({ value: 27, entryId: third });
    filed(await bedside.correct(third, { correction: "void" }));
    expect((await bedside.worksheet()).mechanics).toBeNull();
    expect((await bedside.history()).entries).toHaveLength(4);
  });

  it("an entry that was replaced already is 409 and shows both", async () => {
    const first = idOf(await reading(37));
    const second = idOf(filed(await bedside.correct(first, replaceWith(28, minutesAgo(10)), { as: "intensivist" })));
    const late = await bedside.correct(first, replaceWith(27, minutesAgo(10)));
    expect(late.status).toBe(409);
    const author = { id: bedside.ward.people.intensivist.id, name: bedside.ward.people.intensivist.name };
    expect(conflictOf(late)).toContainEqual({
      field: "plateauCmH2O",
      yours: 27,
      basedOn: 37,
      inForce: { value: 28, entryId: second, chartedAt: expect.any(String), author },
    });
  });

  it("of two who race to correct one entry one is 201, the other 409 with both values", async () => {
    const first = idOf(await reading(37));
    const answers = await Promise.all(
      [27, 28].map((plateau) => bedside.correct(first, replaceWith(plateau, minutesAgo(10)))),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    const lost = answers.find(({ status }) => status === 409);
    expect(lost && conflictOf(lost)?.map(({ field }) => field)).toContain("plateauCmH2O");
    expect(await ChartEntry.count({ where: { supersedesId: first } })).toBe(1);
  });

  it("sent six times with one key is one 201 and five 200", async () => {
    const first = idOf(await reading(37));
    const body = { ...replaceWith(27, minutesAgo(10)), clientKey: randomUUID() };
    const answers = await Promise.all(Array.from({ length: 6 }, () => bedside.correct(first, body)));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 200, 200, 201]);
    expect(await ChartEntry.count({ where: { supersedesId: first } })).toBe(1);
  });
});

describe("whose corrections", () => {
  it("an entry of another patient is 404", async () => {
    const other = await Bedside.open();
    const foreign = idOf(await other.charted("observations", { spo2Percent: 94 }));
    expect((await bedside.correct(foreign, { correction: "void" })).status).toBe(404);
  });

  it("a nurse corrects observations and FiO2 entries", async () => {
    await bedside.settled();
    const spo2 = idOf(await bedside.charted("observations", { spo2Percent: 84 }));
    const entry = { chartedAt: minutesAgo(1), spo2Percent: 94 };
    expect((await bedside.correct(spo2, { correction: "replace", entry }, { as: "nurse" })).status).toBe(201);
    const fio2 = idOf(await bedside.charted("settings", { fio2: 0.6, basedOn: { fio2: 0.5 } }));
    const replacement = { correction: "replace", entry: { chartedAt: minutesAgo(1), fio2: 0.55 } };
    expect((await bedside.correct(fio2, replacement, { as: "nurse" })).status).toBe(201);
  });

  it("a nurse may neither replace, void nor put in other settings, nor touch mechanics", async () => {
    await bedside.settled();
    const fio2 = idOf(
      await bedside.charted("settings", { fio2: 0.6, basedOn: { fio2: 0.5 }, chartedAt: minutesAgo(5) }),
    );
    const peep = idOf(
      await bedside.charted("settings", { peepCmH2O: 12, fio2: 0.7, basedOn: { peepCmH2O: 10, fio2: 0.6 } }),
    );
    const hold = idOf(await reading(27));
    const smuggled = { correction: "replace", entry: { chartedAt: minutesAgo(5), fio2: 0.6, peepCmH2O: 5 } };
    const answer = await bedside.correct(fio2, smuggled, { as: "nurse" });
    expect(answer.status).toBe(403);
    expect(paths(answer)).toEqual(["entry.peepCmH2O"]);
    for (const id of [peep, hold]) {
      expect((await bedside.correct(id, { correction: "void" }, { as: "nurse" })).status).toBe(403);
    }
    const stripped = { correction: "replace", entry: { chartedAt: minutesAgo(1), fio2: 0.7 } };
    expect((await bedside.correct(peep, stripped, { as: "nurse" })).status).toBe(403);
    expect(await SettingChange.count({ where: { entryId: [fio2, peep] } })).toBe(2);
    expect(await ChartEntry.count({ where: { supersedesId: [fio2, peep, hold] } })).toBe(0);
  });
});

describe("undo", () => {
  const entry = () =>
    bedside.charted("bedside-entries", {
      settings: { peepCmH2O: 12 },
      observations: { spo2Percent: 94 },
      basedOn: { peepCmH2O: 10 },
    });

  it("voids the whole submission", async () => {
    await bedside.settled();
    const { submission, entries } = await entry();
    const { worksheet, ...answer } = filed(await bedside.undo(submission.id));
    expect(answer.entries.map(({ kind }) => kind).sort()).toEqual(["observations", "settings"]);
    expect(worksheet.settings?.peepCmH2O?.value).toBe(10);
    expect(worksheet.observations).toBeNull();
    const voids = await ChartEntry.findAll({ where: { supersedesId: entries.map(({ id }) => id) } });
    expect(voids.map(({ correction, reason }) => [correction, reason])).toEqual([
      ["void", "Wrong patient"],
      ["void", "Wrong patient"],
    ]);
  });

  it("leaves alone what was superseded already; with nothing left it is 409", async () => {
    await bedside.settled();
    const answer = await entry();
    filed(await bedside.correct(idOf(answer, "observations"), { correction: "void" }));
    expect(filed(await bedside.undo(answer.submission.id)).entries.map(({ kind }) => kind)).toEqual(["settings"]);
    expect((await bedside.undo(answer.submission.id)).status).toBe(409);
  });

  it("is final: a void is not voided", async () => {
    await bedside.settled();
    const voided = filed(await bedside.undo((await entry()).submission.id));
    expect((await bedside.undo(voided.submission.id)).status).toBe(409);
  });

  it("raced by two is one 201 and one 409", async () => {
    await bedside.settled();
    const { submission } = await entry();
    const answers = await Promise.all([bedside.undo(submission.id), bedside.undo(submission.id)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
  });

  it("of a submission that filed nothing on this patient is 404", async () => {
    const other = await Bedside.open();
    const { submission } = await other.charted("observations", { spo2Percent: 94 });
    expect((await bedside.undo(submission.id)).status).toBe(404);
  });

  it("is not a nurse's where it holds what a nurse may not chart", async () => {
    await bedside.settled();
    const { submission } = await entry();
    expect((await bedside.undo(submission.id, {}, { as: "nurse" })).status).toBe(403);
    const own = await bedside.charted("observations", { spo2Percent: 90 });
    expect((await bedside.undo(own.submission.id, {}, { as: "nurse" })).status).toBe(201);
  });
});
