import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { POST as bedsideEntries } from "@/app/api/patients/[patientId]/bedside-entries/route";
import { POST as patients } from "@/app/api/patients/route";
import { GET as bedsOf } from "@/app/api/units/[unitId]/beds/route";
import { EpisodePause } from "@/db/models";
import { bedsAnswerSchema, type AdmissionAnswer, type BedsAnswer } from "@/lib/contracts";
import { buildBed, buildMember, buildUnit } from "../factories";
import { call } from "../http/call";
import { signedInAs } from "../http/signed-in";
import { minutesAgo, tallMan, volumeControl } from "./bedside";

let unitId: string;
let cookie: string;
let answer: BedsAnswer;

async function admit(bedId: string, name: string): Promise<AdmissionAnswer> {
  const body = {
    ...{ clientKey: randomUUID(), unitId, bedId, name, mrn: randomUUID().slice(0, 8), birthDate: "1958-04-02" },
    ...{ intubatedAt: minutesAgo(40), height: { ...tallMan, chartedAt: minutesAgo(30) } },
  };
  const { status, json } = await call(patients, { cookie, path: "/api/patients", body });
  if (status !== 201) throw new Error(JSON.stringify(json));
  return json as unknown as AdmissionAnswer;
}

async function chart({ patient }: AdmissionAnswer, plateauCmH2O: number, spo2Percent = 94): Promise<void> {
  const body = {
    ...{ clientKey: randomUUID(), chartedAt: minutesAgo(5), basedOn: null, settings: volumeControl },
    ...{ mechanics: { plateauCmH2O, totalPeepCmH2O: 12, hold: "relaxed" }, observations: { spo2Percent } },
  };
  const params = { patientId: patient.id };
  const { status, json } = await call(bedsideEntries, { cookie, path: `/api/patients/${patient.id}/b`, params, body });
  if (status !== 201) throw new Error(JSON.stringify(json));
}

beforeAll(async () => {
  unitId = (await buildUnit()).id;
  cookie = await signedInAs(await buildMember(unitId, "therapist"));
  const beds = [];
  for (let index = 1; index <= 7; index += 1) {
    beds.push(await buildBed({ unitId, label: String(index), sortOrder: index }));
  }
  const names = ["Nora Nothing", "Otto Outside", "Olga Outmost", "Ada Edge", "Ivo Inside", "Paul Paused"];
  const admitted: AdmissionAnswer[] = [];
  for (const [index, name] of names.entries()) admitted.push(await admit(beds[index]?.id ?? "", name));
  const [, outside, outmost, edge, inside, paused] = admitted as [AdmissionAnswer, ...AdmissionAnswer[]];
  if (!outside || !outmost || !edge || !inside || !paused) throw new Error("six patients");
  await chart(outside, 31);
  await chart(outmost, 36);
  await chart(edge, 27);
  await chart(inside, 22);
  await chart(paused, 22);
  await EpisodePause.create({ episodeId: paused.episode.id, pausedAt: new Date(), resumedAt: null });
  const read = await call(bedsOf, { cookie, params: { unitId } });
  answer = read.json as unknown as BedsAnswer;
});

describe("Beds", () => {
  it("S4 puts first what needs a look first: outside by how far, unmeasured, edge, inside, away, free", () => {
    expect(bedsAnswerSchema.safeParse(answer).error).toBeUndefined();
    expect(answer.rows.map(({ patient, state }) => [patient?.name ?? null, state])).toEqual([
      ["Olga Outmost", "outside"],
      ["Otto Outside", "outside"],
      ["Nora Nothing", "unmeasured"],
      ["Ada Edge", "edge"],
      ["Ivo Inside", "inside"],
      ["Paul Paused", "away"],
      [null, null],
    ]);
  });

  it("counts every bed once, in its group or as free", () => {
    const states = answer.rows.map(({ state }) => state ?? "free");
    for (const [group, count] of Object.entries(answer.counts)) {
      expect(count, group).toBe(states.filter((state) => state === group).length);
    }
    expect(Object.values(answer.counts).reduce((sum, count) => sum + count, 0)).toBe(7);
  });

  it("names the cause with its number, and shows initials, day and what is due", () => {
    const row = answer.rows[0];
    expect(row).toMatchObject({
      patient: { initials: "O.O." },
      bed: { label: "3" },
      settings: { peepCmH2O: { value: 10 } },
      derived: { plateauCmH2O: { value: 36, state: "outside" }, drivingPressureCmH2O: { value: 24 } },
      nextStep: null,
    });
    expect(row?.cause.map(({ metric }) => metric)).toContain("plateauCmH2O");
    expect(row?.due.map(({ what }) => what)).toContain("hold");
  });

  it("judges each patient as that patient's worksheet does", async () => {
    const { GET } = await import("@/app/api/patients/[patientId]/worksheet/route");
    for (const { patient, state, derived } of answer.rows) {
      if (!patient) continue;
      const { json } = await call(GET, { cookie, params: { patientId: patient.id } });
      expect(json.group, patient.name).toBe(state);
      expect(derived.plateauCmH2O).toMatchObject({
        value: (json as { derived?: BedsAnswer["rows"][number]["derived"] }).derived?.plateauCmH2O?.value,
      });
    }
  });

  it("says until when it holds", () => {
    expect(Date.parse(answer.validUntil ?? "")).toBeGreaterThan(Date.parse(answer.at));
  });

  it("of another unit is 404", async () => {
    expect((await call(bedsOf, { cookie, params: { unitId: (await buildUnit()).id } })).status).toBe(404);
  });

  it("of a unit without a bed is empty", async () => {
    const empty = (await buildUnit()).id;
    const member = await signedInAs(await buildMember(empty, "nurse"));
    const { status, json } = await call(bedsOf, { cookie: member, params: { unitId: empty } });
    expect(status).toBe(200);
    expect(json).toMatchObject({ rows: [], validUntil: null });
  });
});
