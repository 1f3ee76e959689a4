import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { POST as bedsideEntries } from "@/app/api/patients/[patientId]/bedside-entries/route";
import { POST as corrections } from "@/app/api/patients/[patientId]/entries/[entryId]/corrections/route";
import { POST as mechanics } from "@/app/api/patients/[patientId]/mechanics/route";
import { POST as settings } from "@/app/api/patients/[patientId]/settings/route";
import { POST as settingsChecks } from "@/app/api/patients/[patientId]/settings-checks/route";
import { POST as voidSubmission } from "@/app/api/patients/[patientId]/submissions/[submissionId]/void/route";
import { ChartEntry, MechanicsReading, SettingChange } from "@/db/models";
import { mechanicsFields, settingsValuesSchema } from "@/lib/contracts";
import { buildEntry } from "../factories";
import { call, paths } from "../http/call";
import { signedInAs } from "../http/signed-in";
import { buildWard, type Ward } from "../http/ward";

const otherSettings = Object.keys(settingsValuesSchema.shape).filter((field) => field !== "fio2");
const chartedAt = () => new Date().toISOString();
const common = () => ({ chartedAt: chartedAt(), clientKey: randomUUID() });

interface Place {
  ward: Ward;
  nurse: string;
  therapist: string;
  patientId: string;
}

async function buildPlace(policy: { nursesSetVentilators?: boolean } = {}): Promise<Place> {
  const ward = await buildWard(policy);
  return {
    ward,
    nurse: await signedInAs(ward.people.nurse),
    therapist: await signedInAs(ward.people.therapist),
    patientId: ward.episode.patientId,
  };
}

/** What a ventilator was set to three hours ago, charted by the therapist. */
async function chartWhole({ ward }: Place): Promise<ChartEntry> {
  const entry = await buildEntry({
    episodeId: ward.episode.id,
    authorId: ward.people.therapist.id,
    chartedAt: new Date(Date.now() - 3 * 3_600_000),
  });
  await SettingChange.create({
    entryId: entry.id,
    mode: "A/C-VC",
    tidalVolumeMl: 420,
    respiratoryRate: 20,
    peepCmH2O: 10,
    fio2Percent: 50,
    flowLPerMin: 60,
  });
  return entry;
}

async function chartFio2({ ward }: Place, fio2Percent: number): Promise<ChartEntry> {
  const entry = await buildEntry({
    episodeId: ward.episode.id,
    authorId: ward.people.therapist.id,
    chartedAt: new Date(Date.now() - 3_600_000),
  });
  await SettingChange.create({ entryId: entry.id, fio2Percent });
  return entry;
}

let place: Place;
let setting: Place;

beforeAll(async () => {
  place = await buildPlace();
  setting = await buildPlace({ nursesSetVentilators: true });
  await chartWhole(place);
  await chartWhole(setting);
});

const post = (handler: typeof settings, at: Place, body: unknown, more: Record<string, string> = {}) =>
  call(handler as Parameters<typeof call>[0], {
    cookie: at.nurse,
    params: { patientId: at.patientId, ...more },
    path: `/api/patients/${at.patientId}/${Object.values(more).join("/")}`,
    body,
  });

describe("a nurse's settings body", () => {
  it("charts FiO2 alone", async () => {
    const answer = await post(settings, place, { ...common(), basedOn: { fio2: 0.5 }, fio2: 0.45 });
    expect(answer.status).toBe(201);
    expect(answer.json.worksheet?.settings?.fio2?.value).toBe(0.45);
  });

  it.each(otherSettings)("is refused with %s, naming it", async (field) => {
    const answer = await post(settings, place, { ...common(), basedOn: null, fio2: 0.45, [field]: 10 });
    expect(answer.status).toBe(403);
    expect(paths(answer)).toEqual([field]);
  });

  it("is refused with what no settings body knows, too", async () => {
    expect((await post(settings, place, { ...common(), basedOn: null, fio2: 0.4, note: "x" })).status).toBe(403);
  });

  it("may hold every setting where the unit says that nurses set ventilators", async () => {
    const answer = await post(settings, setting, { ...common(), basedOn: { peepCmH2O: 10 }, peepCmH2O: 12 });
    expect(answer.status).toBe(201);
  });
});

describe("a nurse's bedside entry", () => {
  it("charts FiO2 with observations", async () => {
    const body = { ...common(), basedOn: { fio2: 0.45 }, settings: { fio2: 0.4 }, observations: { spo2Percent: 94 } };
    expect((await post(bedsideEntries, place, body)).status).toBe(201);
  });

  it.each(otherSettings)("is refused with settings.%s, naming it", async (field) => {
    const answer = await post(bedsideEntries, place, { ...common(), basedOn: null, settings: { [field]: 10 } });
    expect(answer.status).toBe(403);
    expect(paths(answer)).toEqual([`settings.${field}`]);
  });

  it.each(mechanicsFields)("is refused with mechanics.%s, naming it", async (field) => {
    const answer = await post(bedsideEntries, place, { ...common(), basedOn: null, mechanics: { [field]: 10 } });
    expect(answer.status).toBe(403);
    expect(paths(answer)).toEqual([`mechanics.${field}`]);
  });

  it("still holds no mechanics where nurses set ventilators", async () => {
    const body = { ...common(), basedOn: null, settings: { peepCmH2O: 12 }, mechanics: { plateauCmH2O: 24 } };
    const answer = await post(bedsideEntries, setting, body);
    expect(answer.status).toBe(403);
    expect(paths(answer)).toEqual(["mechanics.plateauCmH2O"]);
  });
});

describe("a nurse's 'checked, unchanged' and measurements", () => {
  it("are refused, and the check is taken where nurses set ventilators", async () => {
    const check = () => ({ ...common(), basedOn: {} });
    expect((await post(settingsChecks, place, check())).status).toBe(403);
    expect((await post(settingsChecks, setting, check())).status).not.toBe(403);
    expect((await post(mechanics, place, { ...common(), plateauCmH2O: 24 })).status).toBe(403);
    expect((await post(mechanics, setting, { ...common(), plateauCmH2O: 24 })).status).toBe(403);
  });
});

describe("a nurse's correction", () => {
  const replacing = (entry: object) => ({ clientKey: randomUUID(), correction: "replace", reason: "Misread", entry });
  const voiding = () => ({ clientKey: randomUUID(), correction: "void", reason: "Misread" });

  it("replaces an entry of FiO2 alone by FiO2 alone", async () => {
    const { id } = await chartFio2(place, 55);
    const answer = await post(corrections, place, replacing({ chartedAt: chartedAt(), fio2: 0.6 }), { entryId: id });
    expect(answer.status).toBe(201);
  });

  it.each(otherSettings)("is refused with %s in the replacement, naming it", async (field) => {
    const { id } = await chartFio2(place, 55);
    const entry = { chartedAt: chartedAt(), fio2: 0.6, [field]: 10 };
    const answer = await post(corrections, place, replacing(entry), { entryId: id });
    expect(answer.status).toBe(403);
    expect(paths(answer)).toEqual([`entry.${field}`]);
  });

  it("of an entry that charts more than FiO2 is refused, a void too", async () => {
    const { id } = await chartWhole(place);
    const replaced = await post(corrections, place, replacing({ chartedAt: chartedAt(), fio2: 0.6 }), { entryId: id });
    expect(replaced.status).toBe(403);
    expect(paths(replaced)).toContain("peepCmH2O");
    expect((await post(corrections, place, voiding(), { entryId: id })).status).toBe(403);
  });

  it("of a measurement is refused", async () => {
    const entry = await buildEntry({ episodeId: place.ward.episode.id, kind: "mechanics" });
    await MechanicsReading.create({ entryId: entry.id, plateauCmH2O: 24, hold: "relaxed" });
    expect((await post(corrections, place, voiding(), { entryId: entry.id })).status).toBe(403);
  });

  it("reaches no further by voiding the whole submission", async () => {
    const whole = await chartWhole(place);
    const only = await chartFio2(place, 55);
    const send = (submissionId: string) =>
      post(voidSubmission, place, { clientKey: randomUUID(), reason: "Wrong patient" }, { submissionId });
    expect((await send(whole.submissionId)).status).toBe(403);
    expect((await send(only.submissionId)).status).toBe(201);
  });
});

describe("a row of another patient", () => {
  it("is not found through one's own patient: neither its entry nor its submission", async () => {
    const foreign = await chartFio2(setting, 50);
    const own = { ...place, nurse: place.therapist };
    const send = (handler: typeof corrections | typeof voidSubmission, more: Record<string, string>, body: object) =>
      post(handler as unknown as typeof settings, own, { clientKey: randomUUID(), reason: "Misread", ...body }, more);
    expect((await send(corrections, { entryId: foreign.id }, { correction: "void" })).status).toBe(404);
    expect((await send(voidSubmission, { submissionId: foreign.submissionId }, {})).status).toBe(404);
    expect(await ChartEntry.count({ where: { supersedesId: foreign.id } })).toBe(0);
  });
});
