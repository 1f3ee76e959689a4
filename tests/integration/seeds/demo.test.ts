import { beforeAll, describe, expect, it } from "vitest";
import { AuditEvent, ChartEntry, HospitalAdministrator, Submission, Unit, UnitMembership, User } from "@/db/models";
import { sequelize } from "@/db/connection";
import type { Actor } from "@/lib/access/context";
import { grant } from "@/lib/access/grant";
import { passwordMatches } from "@/lib/access/password";
import { readBeds } from "@/lib/chart/read-beds";
import type { BedsAnswer } from "@/lib/contracts";
import { seedDemo } from "@/seeds/seed-demo";

const now = new Date();
const HOUR_MS = 3_600_000;

// Seeds run as the owner, who alone may say when something was recorded.
process.env.DATABASE_URL = process.env.TEST_DATABASE_OWNER_URL;

beforeAll(() => seedDemo(now), 240_000);

async function signedIn(email: string): Promise<Actor> {
  const user = await User.findOne({ where: { email }, rejectOnEmpty: true });
  const memberships = await UnitMembership.findAll({ where: { userId: user.id } });
  return {
    userId: user.id,
    name: user.name,
    email,
    sessionId: "test",
    memberships: memberships.map(({ unitId, role, lead }) => ({ unitId, role, lead })),
    administersHospitalIds: [],
  };
}

async function bedsOf(email: string): Promise<BedsAnswer> {
  const actor = await signedIn(email);
  const params = { unitId: actor.memberships[0]?.unitId };
  const granted = await grant("beds:read", { actor, now }, { params, json: async () => null });
  if (!granted) throw new Error(`${email} sees no unit`);
  return sequelize.transaction((transaction) =>
    readBeds({ actor, now, transaction, requestId: "test", submissionId: null }, granted),
  );
}

const look = ({ rows }: BedsAnswer) =>
  Object.fromEntries(
    rows.map(({ bed, patient, state, due }) => [
      bed.label,
      patient ? [state, ...due.filter(({ overdue }) => overdue).map(({ what }) => what)].join(" ") : "free",
    ]),
  );

describe("the demo", () => {
  it("shows at Harbour what each story tells, with some beds free", async () => {
    expect(look(await bedsOf("nurse@neaptide.test"))).toEqual({
      "1": "unmeasured hold height",
      "2": "unmeasured hold",
      "3": "outside",
      "4": "inside",
      "5": "inside hold",
      "6": "inside",
      "7": "inside",
      "8": "inside",
      "9": "free",
      "10": "outside hold",
      "11": "unmeasured",
      "12": "free",
    });
  });

  it("shows at East what each story tells, at altitude and in kPa", async () => {
    const beds = await bedsOf("nurse.east@neaptide.test");
    expect(look(beds)).toEqual({
      E1: "inside",
      E2: "outside",
      E3: "free",
      E4: "unmeasured hold",
      E5: "inside settings-check",
      E6: "free",
      E7: "unmeasured hold",
      E8: "free",
    });
    expect(beds.unit).toMatchObject({ timeZone: "America/Bogota", gasUnit: "kPa", barometricPressureMmHg: 630 });
  });

  it("has Dmitri Kaplan in bed 7 as the record form opens: VT 5.95 mL/kg, plateau 24, driving pressure 14", async () => {
    const { rows } = await bedsOf("therapist@neaptide.test");
    const bed = rows.find(({ patient }) => patient?.mrn === "30044417");
    expect(bed?.bed.label).toBe("7");
    expect(bed?.patient).toMatchObject({
      name: "Dmitri Kaplan",
      birthDate: "1968-03-12",
      ageYears: expect.any(Number),
    });
    const settings = Object.entries(bed?.settings ?? {}).map(([field, { value }]) => [field, value]);
    expect(Object.fromEntries(settings)).toMatchObject({
      mode: "A/C-VC",
      tidalVolumeMl: 420,
      respiratoryRate: 24,
      fio2: 0.6,
      peepCmH2O: 10,
      inspiratoryTimeS: 0.8,
      flowLPerMin: 45,
      flowPattern: "decelerating",
    });
    expect(bed?.derived.vtMlPerKg?.value).toBeCloseTo(420 / 70.566, 3);
    expect(bed?.derived.plateauCmH2O).toMatchObject({ value: 24, freshness: "current", state: "inside" });
    expect(bed?.derived.drivingPressureCmH2O).toMatchObject({ value: 14, state: "inside" });
  });

  it("was recorded when it tells: a minute after each charted time, over three days that end now", async () => {
    const entries = await ChartEntry.findAll();
    expect(entries.length).toBeGreaterThan(300);
    const late = entries.filter(({ chartedAt, recordedAt, correction }) => {
      const delay = recordedAt.getTime() - chartedAt.getTime();
      return correction === null && (delay < 0 || delay > 2 * 60_000);
    });
    expect(late).toEqual([]);
    const charted = entries.map(({ chartedAt }) => chartedAt.getTime());
    expect(Math.min(...charted)).toBeGreaterThan(now.getTime() - 73 * HOUR_MS);
    expect(Math.max(...charted)).toBeLessThan(now.getTime());
    const filed = [
      await Submission.max<Date, Submission>("recordedAt"),
      await AuditEvent.max<Date, AuditEvent>("recordedAt"),
    ];
    for (const newest of filed) expect(new Date(newest).getTime()).toBeLessThanOrEqual(now.getTime());
  });

  it("has one entry voided with its reason, and readable still", async () => {
    const voided = await ChartEntry.findAll({ where: { correction: "void" } });
    expect(voided.map(({ kind, reason }) => [kind, reason])).toEqual([["mechanics", "Digits turned round"]]);
    expect(await ChartEntry.count({ where: { id: voided[0]?.supersedesId ?? "" } })).toBe(1);
  });

  it("lets its five people in with the one password, each into their own unit", async () => {
    const units = new Map((await Unit.findAll()).map(({ id, name }) => [id, name]));
    const people = await User.findAll({ order: ["id"] });
    const able = [];
    for (const { id, email, passwordHash } of people) {
      if (!(await passwordMatches("small-tides-2026", passwordHash))) continue;
      const memberships = await UnitMembership.findAll({ where: { userId: id } });
      able.push([email, memberships.map(({ unitId, role }) => `${role} ${units.get(unitId)}`).join()]);
    }
    expect(able).toEqual([
      ["therapist@neaptide.test", "therapist Harbour ICU"],
      ["intensivist@neaptide.test", "intensivist Harbour ICU"],
      ["nurse@neaptide.test", "nurse Harbour ICU"],
      ["admin@neaptide.test", ""],
      ["nurse.east@neaptide.test", "nurse East ICU"],
    ]);
    const administrators = await HospitalAdministrator.findAll();
    expect(administrators.map(({ userId }) => people.find(({ id }) => id === userId)?.email)).toEqual([
      "admin@neaptide.test",
    ]);
  });
});
