import { beforeEach, describe, expect, it } from "vitest";
import { GET as entries } from "@/app/api/patients/[patientId]/entries/route";
import { entriesAnswerSchema } from "@/lib/contracts";
import { call, paths } from "../http/call";
import { Bedside, idOf, measuredOn, minutesAgo, volumeControl } from "./bedside";

let bedside: Bedside;

beforeEach(async () => {
  bedside = await Bedside.open();
});

const asked = (query: string) =>
  call(entries, {
    cookie: bedside.cookie(),
    path: `/api/patients/${bedside.patientId}/entries?${query}`,
    params: { patientId: bedside.patientId },
  });

describe("the history of a patient", () => {
  it("holds every kind, newest first, each with the body that was charted", async () => {
    await bedside.settled();
    const { entries } = await bedside.history();
    expect(entriesAnswerSchema.safeParse({ entries, next: null }).error).toBeUndefined();
    expect(entries.map(({ kind }) => kind)).toEqual(["settings", "heights"]);
    expect(entries[0]).toMatchObject({
      body: volumeControl,
      correction: null,
      supersedesId: null,
      supersededById: null,
    });
    expect(Object.keys(entries[0]?.body ?? {}).sort()).toEqual(Object.keys(volumeControl).sort());
  });

  it("of one kind leaves the others out", async () => {
    await bedside.settled();
    expect((await bedside.history({ kind: "heights" })).entries.map(({ kind }) => kind)).toEqual(["heights"]);
  });

  it("of one field holds what charted it, in whichever kind, and what superseded that", async () => {
    await bedside.settled();
    const reading = await bedside.charted("bedside-entries", {
      mechanics: { respiratoryRateTotal: 24 },
      observations: { respiratoryRateTotal: 23, spo2Percent: 94 },
      basedOn: measuredOn(volumeControl),
    });
    await bedside.charted("observations", { spo2Percent: 95 });
    await bedside.correct(idOf(reading, "mechanics"), { correction: "void" });
    const { entries } = await bedside.history({ field: "respiratoryRateTotal" });
    expect(entries.map(({ kind, correction }) => `${kind} ${correction}`).sort()).toEqual([
      "mechanics null",
      "mechanics void",
      "observations null",
    ]);
  });

  it("comes in pages that leave nothing out and repeat nothing", async () => {
    const count = 55;
    for (let index = 0; index < count; index += 1) {
      await bedside.charted("observations", { heartRate: 60 + index, chartedAt: minutesAgo(Math.floor(index / 3)) });
    }
    const first = await bedside.history();
    expect(first.entries).toHaveLength(50);
    const second = await bedside.history({ before: first.next ?? "" });
    expect(second).toMatchObject({ next: null });
    const ids = [...first.entries, ...second.entries].map(({ id }) => id);
    expect(new Set(ids).size).toBe(count);
    const times = [...first.entries, ...second.entries].map(({ chartedAt }) => Date.parse(chartedAt));
    expect(times).toEqual([...times].sort((one, other) => other - one));
  }, 60_000);

  it("before a time holds what was charted earlier", async () => {
    await bedside.charted("observations", { heartRate: 80, chartedAt: minutesAgo(30) });
    await bedside.charted("observations", { heartRate: 90, chartedAt: minutesAgo(10) });
    const { entries } = await bedside.history({ before: minutesAgo(20) });
    expect(entries.map(({ body }) => body)).toEqual([{ heartRate: 80 }]);
  });

  it("refuses a kind, a field or a page that there is not", async () => {
    expect(paths(await asked("kind=weights"))).toEqual(["kind"]);
    expect(paths(await asked("field=shoeSize"))).toEqual(["field"]);
    expect(paths(await asked("before=yesterday"))).toEqual(["before"]);
    expect(paths(await asked("page=2"))).toEqual(["page"]);
  });

  it("of a patient in another unit is 404", async () => {
    const other = await Bedside.open();
    const answer = await call(entries, { cookie: bedside.cookie(), params: { patientId: other.patientId } });
    expect(answer.status).toBe(404);
  });
});
