import { randomUUID } from "node:crypto";
import type { CreationAttributes } from "sequelize";
import {
  Bed,
  ChartEntry,
  Hospital,
  Patient,
  Submission,
  Unit,
  UnitMembership,
  UnitPolicy,
  User,
  VentilationEpisode,
} from "@/db/models";
import { targetsFromSet } from "@/lib/protocol/starting-sets";

let serial = 0;
const next = () => (serial += 1);

/** Each builder writes one row through the application's role; what is not given is invented and unique. */
export async function buildHospital(overrides: Partial<CreationAttributes<Hospital>> = {}): Promise<Hospital> {
  return Hospital.create({ name: `Hospital ${next()}`, ...overrides });
}

export async function buildUnit(
  overrides: Partial<CreationAttributes<Unit>> = {},
  policy: Partial<CreationAttributes<UnitPolicy>> = {},
): Promise<Unit> {
  const hospitalId = overrides.hospitalId ?? (await buildHospital()).id;
  const unit = await Unit.create({ name: `Unit ${next()}`, ...overrides, hospitalId });
  await UnitPolicy.create({
    unitId: unit.id,
    timeZone: "Europe/London",
    barometricPressureMmHg: 760,
    gasUnit: "mmHg",
    defaultTargets: targetsFromSet("unit-default"),
    ...policy,
  });
  return unit;
}

export async function buildBed(overrides: Partial<CreationAttributes<Bed>> = {}): Promise<Bed> {
  const unitId = overrides.unitId ?? (await buildUnit()).id;
  const place = next();
  return Bed.create({ label: String(place), sortOrder: place, ...overrides, unitId });
}

export async function buildUser(overrides: Partial<CreationAttributes<User>> = {}): Promise<User> {
  const place = next();
  return User.create({ email: `person-${place}@example.test`, name: `Person ${place}`, ...overrides });
}

export async function buildMember(
  unitId: string,
  role: UnitMembership["role"],
  overrides: Partial<CreationAttributes<User>> & { lead?: boolean } = {},
): Promise<User> {
  const { lead = false, ...person } = overrides;
  const user = await buildUser(person);
  await UnitMembership.create({ userId: user.id, unitId, role, lead });
  return user;
}

export async function buildSubmission(overrides: Partial<CreationAttributes<Submission>> = {}): Promise<Submission> {
  const authorId = overrides.authorId ?? (await buildUser()).id;
  return Submission.create({ clientKey: randomUUID(), bodyHash: "0".repeat(64), ...overrides, authorId });
}

export async function buildPatient(overrides: Partial<CreationAttributes<Patient>> = {}): Promise<Patient> {
  const hospitalId = overrides.hospitalId ?? (await buildHospital()).id;
  const place = next();
  return Patient.create({
    mrn: String(40_000_000 + place),
    name: `Patient ${place}`,
    birthDate: "1968-03-12",
    ...overrides,
    hospitalId,
  });
}

export async function buildEpisode(
  overrides: Partial<CreationAttributes<VentilationEpisode>> = {},
): Promise<VentilationEpisode> {
  const unit = overrides.unitId ? await Unit.findByPk(overrides.unitId, { rejectOnEmpty: true }) : await buildUnit();
  const patientId = overrides.patientId ?? (await buildPatient({ hospitalId: unit.hospitalId })).id;
  const submissionId = overrides.submissionId ?? (await buildSubmission()).id;
  const intubatedAt = new Date(Date.now() - 24 * 3_600_000);
  return VentilationEpisode.create({ intubatedAt, ...overrides, unitId: unit.id, patientId, submissionId });
}

/** The common row of an entry, without its detail. */
export async function buildEntry(overrides: Partial<CreationAttributes<ChartEntry>> = {}): Promise<ChartEntry> {
  const submission = overrides.submissionId
    ? await Submission.findByPk(overrides.submissionId, { rejectOnEmpty: true })
    : await buildSubmission();
  const episodeId = overrides.episodeId ?? (await buildEpisode()).id;
  return ChartEntry.create({
    kind: "settings",
    chartedAt: new Date(),
    chartedOffsetMin: 0,
    ...overrides,
    submissionId: submission.id,
    authorId: overrides.authorId ?? submission.authorId,
    episodeId,
  });
}
