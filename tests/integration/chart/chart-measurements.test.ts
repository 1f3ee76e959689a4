import { beforeEach, describe, expect, it } from "vitest";
import { ChartEntry, MechanicsReading, Observation, SettingsCheck } from "@/db/models";
import { paths } from "../http/call";
import { Bedside, conflictOf, idOf, minutesAgo, volumeControl } from "./bedside";

let bedside: Bedside;

beforeEach(async () => {
  bedside = await Bedside.open();
});

describe("mechanics", () => {
  it("need no settings and take no basedOn", async () => {
    const answer = await bedside.charted("mechanics", { exhaledTidalVolumeMl: 0, breathStacking: false });
    const row = await MechanicsReading.findByPk(idOf(answer), { rejectOnEmpty: true });
    expect(row).toMatchObject({ exhaledTidalVolumeMl: 0, breathStacking: false, plateauCmH2O: null });
    const refused = await bedside.chart("mechanics", { peakCmH2O: 30, basedOn: {} });
    expect(paths(refused)).toEqual(["basedOn"]);
  });

  it("are judged by the set PEEP in force when they were taken", async () => {
    await bedside.settled(volumeControl, 180);
    await bedside.charted("settings", { peepCmH2O: 14, basedOn: { peepCmH2O: 10 }, chartedAt: minutesAgo(60) });
    expect((await bedside.chart("mechanics", { totalPeepCmH2O: 9, chartedAt: minutesAgo(90) })).status).toBe(201);
    expect(paths(await bedside.chart("mechanics", { totalPeepCmH2O: 9, chartedAt: minutesAgo(30) }))).toEqual([
      "totalPeepCmH2O",
    ]);
  });

  it("without any value are 422, and so is a hold that was not possible without a why", async () => {
    expect((await bedside.chart("mechanics", {})).status).toBe(422);
    expect(paths(await bedside.chart("mechanics", { hold: "not-possible" }))).toEqual(["holdReason"]);
    expect((await bedside.chart("mechanics", { hold: "not-possible", holdReason: "Coughing" })).status).toBe(201);
  });

  it("are not a nurse's", async () => {
    expect((await bedside.chart("mechanics", { peakCmH2O: 30 }, { as: "nurse" })).status).toBe(403);
  });

  it("V3 the newest of each field stands, each with its own entry", async () => {
    const first = await bedside.charted("mechanics", { peakCmH2O: 30, totalPeepCmH2O: 11, chartedAt: minutesAgo(20) });
    const second = await bedside.charted("mechanics", { peakCmH2O: 32, chartedAt: minutesAgo(10) });
    const { mechanics } = await bedside.worksheet();
    expect(mechanics).toMatchObject({
      peakCmH2O: { value: 32, entryId: idOf(second) },
      totalPeepCmH2O: { value: 11, entryId: idOf(first) },
    });
  });
});

describe("observations", () => {
  it("are anyone's who charts, and stand on the worksheet", async () => {
    const answer = await bedside.charted("observations", { spo2Percent: 91.5, mapMmHg: 62 }, { as: "nurse" });
    const row = await Observation.findByPk(idOf(answer), { rejectOnEmpty: true });
    expect(row).toMatchObject({ spo2Percent: 91.5, mapMmHg: 62, heartRate: null });
    expect(answer.worksheet.observations).toMatchObject({ spo2Percent: { value: 91.5 }, mapMmHg: { value: 62 } });
  });

  it("without any value are 422", async () => {
    expect((await bedside.chart("observations", {})).status).toBe(422);
  });
});

describe("checked, unchanged", () => {
  const check = (basedOn: unknown, as: "therapist" | "nurse" = "therapist") =>
    bedside.chart("settings-checks", { basedOn }, { as });

  it("confirms every setting in force and becomes the worksheet's last check", async () => {
    await bedside.settled();
    const answer = await bedside.charted("settings-checks", { basedOn: volumeControl });
    expect(await SettingsCheck.count({ where: { entryId: idOf(answer) } })).toBe(1);
    const entry = await ChartEntry.findByPk(idOf(answer), { rejectOnEmpty: true });
    expect(answer.worksheet.settingsCheckedAt).toMatchObject({
      value: entry.chartedAt.toISOString(),
      entryId: entry.id,
    });
  });

  it("that leaves out a setting in force is 422", async () => {
    await bedside.settled();
    const { fio2: _left, ...rest } = volumeControl;
    expect(paths(await check(rest))).toEqual(["basedOn.fio2"]);
  });

  it("of a setting that was changed meanwhile is 409", async () => {
    await bedside.settled();
    const answer = await check({ ...volumeControl, peepCmH2O: 8 });
    expect(answer.status).toBe(409);
    expect(conflictOf(answer)).toMatchObject([{ field: "peepCmH2O", basedOn: 8, inForce: { value: 10 } }]);
  });

  it("of a setting that is no longer in force is 409", async () => {
    await bedside.settled();
    expect(conflictOf(await check({ ...volumeControl, flowLPerMin: 60 }))).toMatchObject([
      { field: "flowLPerMin", basedOn: 60, inForce: null },
    ]);
  });

  it("where nothing is in force is 422", async () => {
    expect((await check(null)).status).toBe(422);
  });

  it("is a nurse's only where nurses set ventilators", async () => {
    await bedside.settled();
    expect((await check(volumeControl, "nurse")).status).toBe(403);
    bedside = await Bedside.open({ policy: { nursesSetVentilators: true } });
    await bedside.settled();
    expect((await check(volumeControl, "nurse")).status).toBe(201);
  });
});
