import { randomUUID } from "node:crypto";
import { beforeEach, describe, expect, it } from "vitest";
import { ChartEntry, MechanicsReading, Observation, SettingChange } from "@/db/models";
import { paths } from "../http/call";
import { Bedside, conflictOf, idOf, measuredOn, minutesAgo, volumeControl } from "./bedside";

let bedside: Bedside;

beforeEach(async () => {
  bedside = await Bedside.open();
  await bedside.settled();
});

const basedOn = measuredOn(volumeControl);
const step = {
  settings: { peepCmH2O: 12 },
  mechanics: { plateauCmH2O: 27, hold: "relaxed", totalPeepCmH2O: 12 },
  basedOn,
};
const rows = (submissionId: string) => ChartEntry.findAll({ where: { submissionId }, order: [["id", "ASC"]] });

describe("a bedside entry", () => {
  it("files one entry a kind it carries, at one time and under one submission", async () => {
    const chartedAt = minutesAgo(2);
    const answer = await bedside.charted("bedside-entries", { ...step, observations: { spo2Percent: 94 }, chartedAt });
    expect(answer.entries.map(({ kind }) => kind)).toEqual(["settings", "mechanics", "observations"]);
    const filed = await rows(answer.submission.id);
    expect(filed.map((row) => row.chartedAt.toISOString())).toEqual([chartedAt, chartedAt, chartedAt]);
    const [settings, mechanics, observations] = [
      await SettingChange.findByPk(idOf(answer, "settings"), { rejectOnEmpty: true }),
      await MechanicsReading.findByPk(idOf(answer, "mechanics"), { rejectOnEmpty: true }),
      await Observation.findByPk(idOf(answer, "observations"), { rejectOnEmpty: true }),
    ];
    expect(settings).toMatchObject({ peepCmH2O: 12, mode: null, fio2Percent: null });
    expect(mechanics).toMatchObject({ plateauCmH2O: 27, totalPeepCmH2O: 12, hold: "relaxed", peakCmH2O: null });
    expect(observations).toMatchObject({ spo2Percent: 94, heartRate: null });
  });

  it("V3 its reading counts as taken after its own change: driving pressure 27 − 12 = 15 is current", async () => {
    const { worksheet } = await bedside.charted("bedside-entries", step);
    expect(worksheet.derived.drivingPressureCmH2O).toMatchObject({ value: 15, freshness: "current", state: "edge" });
    expect(worksheet.mechanics?.plateauCmH2O).toMatchObject({ value: 27 });
  });

  it("with one refused part files nothing at all", async () => {
    const before = await ChartEntry.count({ where: { episodeId: bedside.episodeId } });
    const answer = await bedside.chart("bedside-entries", { ...step, observations: { spo2Percent: 20 } });
    expect(answer.status).toBe(422);
    expect(paths(answer)).toEqual(["observations.spo2Percent"]);
    expect(await ChartEntry.count({ where: { episodeId: bedside.episodeId } })).toBe(before);
  });

  it("without any part is 422", async () => {
    expect((await bedside.chart("bedside-entries", { basedOn })).status).toBe(422);
  });

  it("takes basedOn and reason on the outside only", async () => {
    const inside = { settings: { peepCmH2O: 12, reason: "x", basedOn: {} }, basedOn: { peepCmH2O: 10 } };
    const answer = await bedside.chart("bedside-entries", inside);
    expect(answer.status).toBe(422);
    expect(paths(answer).sort()).toEqual(["settings.basedOn", "settings.reason"]);
  });

  it("with mechanics says on which volume, pressures, PEEP and mode it measured", async () => {
    const answer = await bedside.chart("bedside-entries", { ...step, basedOn: { peepCmH2O: 10 } });
    expect(answer.status).toBe(422);
    expect(paths(answer).sort()).toEqual(
      ["mode", "pressureAbovePeepCmH2O", "pressureSupportCmH2O", "tidalVolumeMl"].map((field) => `basedOn.${field}`),
    );
  });

  it("that measured on a PEEP that was changed meanwhile is 409, though it changes no setting", async () => {
    await bedside.charted("settings", { peepCmH2O: 14, basedOn: { peepCmH2O: 10 }, chartedAt: minutesAgo(5) });
    const answer = await bedside.chart("bedside-entries", { mechanics: { plateauCmH2O: 27 }, basedOn });
    expect(answer.status).toBe(409);
    expect(conflictOf(answer)).toMatchObject([
      { field: "peepCmH2O", yours: null, basedOn: 10, inForce: { value: 14 } },
    ]);
  });

  it("with observations alone touches no setting, whatever it was based on", async () => {
    for (const shown of [null, {}, { peepCmH2O: 99 }]) {
      const answer = await bedside.chart("bedside-entries", { observations: { heartRate: 88 }, basedOn: shown });
      expect(answer.status, JSON.stringify(shown)).toBe(201);
    }
  });

  it("sends a reason that stands with its settings", async () => {
    const change = { settings: { tidalVolumeMl: 600 }, basedOn: { tidalVolumeMl: 420 } };
    expect(paths(await bedside.chart("bedside-entries", change))).toEqual(["reason"]);
    const answer = await bedside.charted("bedside-entries", { ...change, reason: "Breath stacking" });
    const row = await SettingChange.findByPk(idOf(answer), { rejectOnEmpty: true });
    expect(row.reason).toBe("Breath stacking");
  });

  it("recording a measurement outside the order never asks for a reason", async () => {
    const answer = await bedside.chart("bedside-entries", {
      mechanics: { plateauCmH2O: 36, hold: "relaxed" },
      basedOn,
    });
    expect(answer.status).toBe(201);
    expect(answer.json.worksheet?.derived.plateauCmH2O).toMatchObject({ value: 36, state: "outside" });
  });

  it("sent six times at once is one 201 and five 200, with one row a kind", async () => {
    const body = { ...step, clientKey: randomUUID(), chartedAt: minutesAgo(0) };
    const answers = await Promise.all(Array.from({ length: 6 }, () => bedside.chart("bedside-entries", body)));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 200, 200, 201]);
    const { submission } = answers[0]?.json as unknown as { submission: { id: string } };
    expect((await rows(submission.id)).map(({ kind }) => kind)).toEqual(["settings", "mechanics"]);
  });

  it("with the same key and other kinds is 409", async () => {
    const clientKey = randomUUID();
    const chartedAt = minutesAgo(0);
    await bedside.charted("bedside-entries", { ...step, clientKey, chartedAt });
    const more = { ...step, clientKey, chartedAt, observations: { spo2Percent: 94 } };
    expect((await bedside.chart("bedside-entries", more)).status).toBe(409);
    const route = await bedside.chart("settings", { peepCmH2O: 12, basedOn, clientKey, chartedAt });
    expect(route.status).toBe(409);
  });
});

describe("a reading against the set PEEP", () => {
  const measure = (mechanics: object, settings?: object) =>
    bedside.chart("bedside-entries", { mechanics, settings, basedOn });

  it("total PEEP up to 2 below it is charted, more is refused", async () => {
    expect((await measure({ totalPeepCmH2O: 8 })).status).toBe(201);
    const answer = await measure({ totalPeepCmH2O: 7.9 });
    expect(answer.status).toBe(422);
    expect(paths(answer)).toEqual(["mechanics.totalPeepCmH2O"]);
  });

  it("plateau at or below it is refused where no total PEEP was measured", async () => {
    expect(paths(await measure({ plateauCmH2O: 10 }))).toEqual(["mechanics.plateauCmH2O"]);
    expect((await measure({ plateauCmH2O: 10.1 })).status).toBe(201);
  });

  it("is judged by the PEEP that the same entry sets", async () => {
    expect(paths(await measure({ totalPeepCmH2O: 9 }, { peepCmH2O: 12 }))).toEqual(["mechanics.totalPeepCmH2O"]);
    expect((await measure({ totalPeepCmH2O: 9 })).status).toBe(201);
  });

  it("plateau up to 2 above peak is charted, more is refused", async () => {
    expect((await measure({ plateauCmH2O: 26, peakCmH2O: 24 })).status).toBe(201);
    expect(paths(await measure({ plateauCmH2O: 26.5, peakCmH2O: 24 }))).toEqual(["mechanics.plateauCmH2O"]);
  });

  it("plateau at or below total PEEP is refused", async () => {
    expect((await measure({ plateauCmH2O: 14, totalPeepCmH2O: 14 })).status).toBe(422);
  });
});

describe("a nurse's bedside entry", () => {
  it("holds FiO2 and observations", async () => {
    const body = { settings: { fio2: 0.6 }, observations: { spo2Percent: 91 }, basedOn: { fio2: 0.5 } };
    expect((await bedside.chart("bedside-entries", body, { as: "nurse" })).status).toBe(201);
  });

  it("with mechanics or another setting is 403 naming them", async () => {
    const body = { settings: { fio2: 0.6, respiratoryRate: 22 }, mechanics: { plateauCmH2O: 27 }, basedOn };
    const answer = await bedside.chart("bedside-entries", body, { as: "nurse" });
    expect(answer.status).toBe(403);
    expect(paths(answer)).toEqual(["settings.respiratoryRate", "mechanics.plateauCmH2O"]);
  });
});
