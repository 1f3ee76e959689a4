import { beforeEach, describe, expect, it } from "vitest";
import { sequelize } from "@/db/connection";
import {
  ChartEntry,
  Height,
  MechanicsReading,
  Observation,
  SettingChange,
  SettingsCheck,
  type VentilationEpisode,
} from "@/db/models";
import { detailOf, detailTables } from "@/lib/chart/detail-tables";
import { factsOf } from "@/lib/chart/facts-of";
import { loadFactRows } from "@/lib/chart/queries/load-facts";
import type { EntryKind } from "@/lib/contracts";
import type { Facts } from "@/lib/protocol";
import { buildEntry, buildEpisode } from "../factories";
import { volumeControl } from "./bedside";

const now = new Date();
const models = {
  settings: SettingChange,
  "settings-checks": SettingsCheck,
  mechanics: MechanicsReading,
  observations: Observation,
  heights: Height,
};
let episode: VentilationEpisode;

beforeEach(async () => {
  episode = await buildEpisode({ intubatedAt: new Date(now.getTime() - 400 * 3_600_000) });
});

/** An entry as it was charted so many hours ago, when nobody could chart it anew today. */
async function chartedHoursAgo(hours: number, kind: EntryKind, body: Record<string, unknown>): Promise<string> {
  const chartedAt = new Date(now.getTime() - hours * 3_600_000);
  const { id } = await buildEntry({ episodeId: episode.id, kind, chartedAt });
  await (models[kind] as typeof SettingsCheck).create({ entryId: id, ...detailOf(kind, body) });
  return id;
}

async function factsAt(at = now, knownAt?: Date): Promise<Facts> {
  const rows = await sequelize.transaction((transaction) =>
    loadFactRows({ episodeIds: [episode.id], at, knownAt }, transaction),
  );
  return factsOf(rows);
}

const idsOf = (facts: readonly { id: string }[] | undefined) => (facts ?? []).map(({ id }) => id);

describe("the columns of every kind", () => {
  it("are those of its model", () => {
    for (const [kind, { table, columnOf }] of Object.entries(detailTables)) {
      const model = models[kind as EntryKind] as typeof SettingsCheck;
      expect(model.tableName).toBe(table);
      const columns = Object.values(model.getAttributes()).map(({ field }) => field);
      expect(columns, kind).toEqual(expect.arrayContaining([...columnOf.values()]));
      expect(columnOf.size + 2, kind).toBe(columns.length);
    }
  });
});

describe("facts", () => {
  it("hold 48 h of readings, and before that of each field the whole entry with its newest value", async () => {
    const old = await chartedHoursAgo(90, "mechanics", { plateauCmH2O: 33, hold: "relaxed", peakCmH2O: 40 });
    const between = await chartedHoursAgo(70, "mechanics", { peakCmH2O: 38 });
    const spent = await chartedHoursAgo(95, "mechanics", { peakCmH2O: 41 });
    const fresh = await chartedHoursAgo(47, "mechanics", { peakCmH2O: 36 });
    const ids = idsOf((await factsAt()).mechanics);
    expect(ids).toEqual([old, between, fresh]);
    expect(ids).not.toContain(spent);
  });

  it("F7 reach back to the newest relaxed plateau, though a hold with effort came after it", async () => {
    const relaxed = await chartedHoursAgo(80, "mechanics", { plateauCmH2O: 33, hold: "relaxed" });
    const effort = await chartedHoursAgo(60, "mechanics", { plateauCmH2O: 25, hold: "effort" });
    expect(idsOf((await factsAt()).mechanics)).toEqual([relaxed, effort]);
  });

  it("V1 hold settings back to the newest entry with a mode, however old", async () => {
    await chartedHoursAgo(300, "settings", volumeControl);
    const mode = await chartedHoursAgo(200, "settings", volumeControl);
    const change = await chartedHoursAgo(100, "settings", { peepCmH2O: 12 });
    const facts = await factsAt();
    expect(idsOf(facts.settings)).toEqual([mode, change]);
    expect(facts.settings?.[1]).toMatchObject({ peepCmH2O: 12, chartedAt: expect.any(String) });
    expect(facts.settings?.[1]).not.toHaveProperty("fio2");
  });

  it("V5 hold the settings in force at an older reading that still counts", async () => {
    const first = await chartedHoursAgo(300, "settings", volumeControl);
    await chartedHoursAgo(250, "mechanics", { plateauCmH2O: 30, hold: "relaxed" });
    const later = await chartedHoursAgo(200, "settings", { ...volumeControl, peepCmH2O: 14 });
    expect(idsOf((await factsAt()).settings)).toEqual([first, later]);
  });

  it("hold every standing height and the newest older settings check", async () => {
    const heights = [
      await chartedHoursAgo(300, "heights", { method: "reported", sexForPbw: "male", heightCm: 170 }),
      await chartedHoursAgo(200, "heights", { method: "ulna", sexForPbw: "male", ulnaCm: 26, heightCm: 172.8 }),
    ];
    await chartedHoursAgo(120, "settings-checks", {});
    const check = await chartedHoursAgo(60, "settings-checks", {});
    const facts = await factsAt();
    expect(idsOf(facts.heights)).toEqual(heights);
    expect(idsOf(facts.settingsChecks)).toEqual([check]);
  });

  it("at a past moment leave out what was charted after it", async () => {
    const first = await chartedHoursAgo(10, "observations", { spo2Percent: 93 });
    await chartedHoursAgo(2, "observations", { spo2Percent: 95 });
    expect(idsOf((await factsAt(new Date(now.getTime() - 5 * 3_600_000))).observations)).toEqual([first]);
  });

  it("FiO2 0.57 comes back as 0.57, as does every other whole percent", async () => {
    for (let percent = 21; percent <= 100; percent += 1) {
      const fio2 = percent / 100;
      await chartedHoursAgo(40 - percent / 100, "settings", percent === 21 ? { ...volumeControl, fio2 } : { fio2 });
    }
    const { settings = [] } = await factsAt();
    expect(settings.map(({ fio2 }) => fio2)).toEqual(Array.from({ length: 80 }, (_, index) => (index + 21) / 100));
    expect(settings.map(({ fio2 }) => fio2)).toContain(0.57);
  }, 60_000);

  it("of several episodes come in one answer, each with its own", async () => {
    const mine = await chartedHoursAgo(1, "observations", { spo2Percent: 93 });
    const [first] = [episode];
    episode = await buildEpisode();
    const other = await chartedHoursAgo(1, "observations", { spo2Percent: 96 });
    const rows = await sequelize.transaction((transaction) =>
      loadFactRows({ episodeIds: [first.id, episode.id], at: now }, transaction),
    );
    const ids = new Map(rows.map(({ episodeId, facts }) => [episodeId, idsOf(facts)]));
    expect(ids).toEqual(
      new Map([
        [first.id, [mine]],
        [episode.id, [other]],
      ]),
    );
    expect(await ChartEntry.count({ where: { id: [mine, other] } })).toBe(2);
  });
});
