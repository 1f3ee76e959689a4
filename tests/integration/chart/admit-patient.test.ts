import { randomUUID } from "node:crypto";
import { beforeEach, describe, expect, it } from "vitest";
import { POST as patients } from "@/app/api/patients/route";
import { AuditEvent, BedStay, ChartEntry, Height, Patient, VentilationEpisode, type Bed } from "@/db/models";
import type { AdmissionAnswer } from "@/lib/contracts";
import { buildBed, buildHospital, buildMember, buildUnit } from "../factories";
import { call, paths, type Answered } from "../http/call";
import { signedInAs } from "../http/signed-in";
import { minutesAgo, tallMan } from "./bedside";

let unitId: string;
let beds: Bed[];
let cookies: Record<"therapist" | "nurse", string>;
let serial = 70_000_000;

beforeEach(async () => {
  unitId = (await buildUnit()).id;
  beds = [await buildBed({ unitId }), await buildBed({ unitId })];
  cookies = {
    therapist: await signedInAs(await buildMember(unitId, "therapist")),
    nurse: await signedInAs(await buildMember(unitId, "nurse")),
  };
});

const person = () => ({ mrn: String((serial += 1)), name: "Rosa Ebb", birthDate: "1960-02-29" });

const admit = (body: Record<string, unknown>, as: "therapist" | "nurse" = "therapist") =>
  call(patients, {
    cookie: cookies[as],
    path: "/api/patients",
    body: { clientKey: randomUUID(), unitId, bedId: beds[0]?.id, intubatedAt: minutesAgo(30), ...person(), ...body },
  });

function admitted(answer: Answered): AdmissionAnswer {
  if (answer.status !== 201) throw new Error(`answered ${answer.status}: ${JSON.stringify(answer.json)}`);
  return answer.json as unknown as AdmissionAnswer;
}

async function end(episodeId: string): Promise<void> {
  const endedAt = new Date();
  await VentilationEpisode.update({ endedAt, endReason: "liberation" }, { where: { id: episodeId } });
  const stay = await BedStay.findOne({ where: { episodeId }, rejectOnEmpty: true });
  const from = (stay.during as { value: Date }[])[0]?.value ?? new Date(0);
  await stay.update({ during: [from, new Date(Math.max(endedAt.getTime(), from.getTime() + 1))] });
}

describe("an admission", () => {
  it("makes patient, episode and bed stay, and says so in the audit", async () => {
    const who = person();
    const { patient, episode } = admitted(await admit({ ...who, ardsRiskFactor: "Pneumonia", tubeSizeMm: 7.5 }));
    expect(patient).toEqual({ id: patient.id, ...who });
    const row = await VentilationEpisode.findByPk(episode.id, { rejectOnEmpty: true });
    expect(row).toMatchObject({
      patientId: patient.id,
      unitId,
      endedAt: null,
      ardsRiskFactor: "Pneumonia",
      tubeSizeMm: 7.5,
    });
    expect(row.intubatedAt.toISOString()).toBe(episode.intubatedAt);
    expect(await BedStay.count({ where: { episodeId: episode.id, bedId: beds[0]?.id ?? "" } })).toBe(1);
    const audit = await AuditEvent.findOne({
      where: { patientId: patient.id, action: "patient.admit" },
      rejectOnEmpty: true,
    });
    expect(audit.submissionId).toBe(row.submissionId);
  });

  it("files the height that came along", async () => {
    const { episode } = admitted(await admit({ height: tallMan }));
    const entry = await ChartEntry.findOne({ where: { episodeId: episode.id }, rejectOnEmpty: true });
    expect(entry.kind).toBe("heights");
    expect(await Height.findByPk(entry.id, { rejectOnEmpty: true })).toMatchObject(tallMan);
  });

  it("with a height that cannot be worked out admits nobody", async () => {
    const who = { ...person(), birthDate: "1990-05-05" };
    const height = { method: "knee-height", sexForPbw: "female", kneeHeightCm: 50 };
    const answer = await admit({ ...who, height });
    expect(answer.status).toBe(422);
    expect(paths(answer)).toEqual(["height.kneeHeightCm"]);
    expect(await Patient.count({ where: { mrn: who.mrn } })).toBe(0);
  });

  it("is not a nurse's, and answers a foreign unit as if it were not there", async () => {
    expect((await admit({}, "nurse")).status).toBe(403);
    const foreign = await buildBed();
    expect((await admit({ unitId: foreign.unitId, bedId: foreign.id })).status).toBe(404);
  });
});

describe("who is admitted", () => {
  const bornYearsAgo = (years: number, days = 0) => {
    const born = new Date();
    born.setUTCFullYear(born.getUTCFullYear() - years);
    born.setUTCDate(born.getUTCDate() - days);
    return born.toISOString().slice(0, 10);
  };

  it("under 16 years is 422 with a sentence, from the 16th birthday on is admitted", async () => {
    const young = await admit({ birthDate: bornYearsAgo(16, -2) });
    expect(young.status).toBe(422);
    expect(young.json.errors).toEqual([
      { path: "birthDate", message: "Under 16 years is refused: the limits here hold for adults only." },
    ]);
    expect((await admit({ birthDate: bornYearsAgo(16, 2) })).status).toBe(201);
  });

  it("born more than 120 years ago, or not yet, is 422", async () => {
    for (const birthDate of ["1890-01-01", bornYearsAgo(-1), "2000-02-30"]) {
      expect(paths(await admit({ birthDate })), birthDate).toContain("birthDate");
    }
  });

  it("intubated ahead of now by more than 5 min, or before birth, is 422; up to 5 min is stored as now", async () => {
    expect(paths(await admit({ intubatedAt: minutesAgo(-6) }))).toEqual(["intubatedAt"]);
    expect(paths(await admit({ intubatedAt: "1950-01-01T00:00:00Z" }))).toEqual(["intubatedAt"]);
    const { episode } = admitted(await admit({ intubatedAt: minutesAgo(-4) }));
    expect(Date.parse(episode.intubatedAt)).toBeLessThanOrEqual(Date.now());
  });

  it("a known MRN with another birth date is 422 at mrn and shows nothing of that patient", async () => {
    const who = person();
    admitted(await admit({ ...who, name: "Known Person" }));
    const answer = await admit({ ...who, birthDate: "1961-02-28", bedId: beds[1]?.id });
    expect(answer.status).toBe(422);
    expect(paths(answer)).toEqual(["mrn"]);
    expect(JSON.stringify(answer.json)).not.toContain("Known Person");
  });

  it("a patient whose episode ended is admitted again by exact MRN and birth date, as the same patient", async () => {
    const who = person();
    const first = admitted(await admit(who));
    await end(first.episode.id);
    const second = admitted(await admit(who));
    expect(second.patient.id).toBe(first.patient.id);
    expect(second.episode.id).not.toBe(first.episode.id);
  });

  it("a patient with an open episode is 409", async () => {
    const who = person();
    admitted(await admit(who));
    const answer = await admit({ ...who, bedId: beds[1]?.id });
    expect(answer.status).toBe(409);
    expect(paths(answer)).toEqual(["mrn"]);
  });

  it("the same MRN in another hospital is another patient", async () => {
    const who = person();
    const { patient } = admitted(await admit(who));
    const other = await buildUnit({ hospitalId: (await buildHospital()).id });
    const bed = await buildBed({ unitId: other.id });
    const cookie = await signedInAs(await buildMember(other.id, "intensivist"));
    const body = { clientKey: randomUUID(), unitId: other.id, bedId: bed.id, intubatedAt: minutesAgo(5), ...who };
    const answer = await call(patients, { cookie, path: "/api/patients", body });
    expect(admitted(answer).patient.id).not.toBe(patient.id);
  });
});

describe("the bed", () => {
  it("that is taken is 409 with a sentence", async () => {
    admitted(await admit({}));
    const answer = await admit({});
    expect(answer.status).toBe(409);
    expect(answer.json.detail).toBe(`Bed ${beds[0]?.label} is taken: choose a free one.`);
  });

  it("of another unit is 422", async () => {
    expect(paths(await admit({ bedId: (await buildBed()).id }))).toEqual(["bedId"]);
  });

  it("raced by two patients takes one; the other is 409 and leaves no patient behind", async () => {
    const [one, other] = [person(), person()];
    const answers = await Promise.all([admit(one), admit(other)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect(await Patient.count({ where: { mrn: [one.mrn, other.mrn] } })).toBe(1);
  });
});

describe("one patient admitted twice at once", () => {
  it("to two beds is one 201 and one 409", async () => {
    const who = person();
    const answers = await Promise.all(beds.map(({ id }) => admit({ ...who, bedId: id })));
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
  });

  it("with one key is one 201 and five 200 with the same ids", async () => {
    const body = { clientKey: randomUUID(), ...person(), intubatedAt: minutesAgo(9) };
    const answers = await Promise.all(Array.from({ length: 6 }, () => admit(body)));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 200, 200, 201]);
    expect(new Set(answers.map(({ json }) => JSON.stringify(json))).size).toBe(1);
  });
});
