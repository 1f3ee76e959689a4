import pg from "pg";
import { beforeEach, describe, expect, it } from "vitest";
import { ChartEntry, VentilationEpisode } from "@/db/models";
import { Bedside, idOf } from "./bedside";

let bedside: Bedside;

beforeEach(async () => {
  bedside = await Bedside.open();
});

describe("every save", () => {
  it("is announced to whoever listens, with unit and patient, once it is committed", async () => {
    const listener = new pg.Client({ connectionString: process.env.DATABASE_URL });
    await listener.connect();
    try {
      const heard: unknown[] = [];
      listener.on("notification", ({ payload }) => heard.push(JSON.parse(payload ?? "null")));
      await listener.query("LISTEN neaptide_chart");
      await bedside.charted("observations", { spo2Percent: 94 });
      await bedside.chart("observations", { spo2Percent: 940 });
      await expect.poll(() => heard).toEqual([{ unitId: bedside.ward.unit.id, patientId: bedside.patientId }]);
    } finally {
      await listener.end();
    }
  });

  it("takes recordedAt from the server's clock, whatever time it tells of", async () => {
    const before = Date.now();
    const answer = await bedside.charted("observations", {
      spo2Percent: 94,
      chartedAt: new Date(before - 7_200_000).toISOString(),
    });
    const { recordedAt, chartedAt } = await ChartEntry.findByPk(idOf(answer), { rejectOnEmpty: true });
    expect(chartedAt.getTime()).toBe(before - 7_200_000);
    expect(Math.abs(recordedAt.getTime() - before)).toBeLessThan(60_000);
  });
});

describe("an episode that has ended", () => {
  it("takes no new entry (409), but what was charted may still be corrected", async () => {
    const reading = idOf(await bedside.charted("observations", { spo2Percent: 40 }));
    await VentilationEpisode.update(
      { endedAt: new Date(), endReason: "liberation" },
      { where: { id: bedside.episodeId } },
    );
    expect((await bedside.chart("observations", { spo2Percent: 94 })).status).toBe(409);
    expect((await bedside.correct(reading, { correction: "void" })).status).toBe(201);
  });
});
