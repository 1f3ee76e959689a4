import { Hospital, HospitalAdministrator, UnitMembership, User } from "@/db/models";
import { hashPassword } from "@/lib/access/password";
import type { Actor } from "@/lib/access/context";
import type { Role } from "@/lib/contracts";

/** The one password of everybody who can sign in to the demo. */
const PASSWORD = "small-tides-2026";

export type UnitKey = "harbour" | "east";

interface Person {
  email: string;
  name: string;
  title: string;
  unit?: UnitKey;
  role?: Role;
  lead?: true;
  /** Charts in the stories and has no password: nobody signs in as them. */
  silent?: true;
}

const people = {
  therapist: {
    email: "therapist@neaptide.test",
    name: "M. Okafor, RT",
    title: "Respiratory therapist",
    unit: "harbour",
    role: "therapist",
  },
  intensivist: {
    email: "intensivist@neaptide.test",
    name: "Dr L. Lindqvist",
    title: "Intensivist",
    unit: "harbour",
    role: "intensivist",
    lead: true,
  },
  nurse: {
    email: "nurse@neaptide.test",
    name: "T. Marsh, RN",
    title: "Nurse",
    unit: "harbour",
    role: "nurse",
  },
  administrator: { email: "admin@neaptide.test", name: "P. Adeyemi", title: "Administrator" },
  eastNurse: {
    email: "nurse.east@neaptide.test",
    name: "C. Rojas, RN",
    title: "Nurse",
    unit: "east",
    role: "nurse",
  },
  eastTherapist: {
    email: "therapist.east@neaptide.test",
    name: "D. Salcedo, RT",
    title: "Respiratory therapist",
    unit: "east",
    role: "therapist",
    silent: true,
  },
  eastIntensivist: {
    email: "intensivist.east@neaptide.test",
    name: "Dr A. Restrepo",
    title: "Intensivist",
    unit: "east",
    role: "intensivist",
    lead: true,
    silent: true,
  },
} as const satisfies Record<string, Person>;

export type PersonKey = keyof typeof people;

export type Cast = Record<PersonKey, Actor>;

async function hire(person: Person, unitIds: Record<UnitKey, string>, passwordHash: string): Promise<Actor> {
  const { email, name, title, unit, role, lead = false } = person;
  const { id } = await User.create({ email, name, title, passwordHash: person.silent ? null : passwordHash });
  const memberships = unit && role ? [{ unitId: unitIds[unit], role, lead }] : [];
  for (const membership of memberships) await UnitMembership.create({ userId: id, ...membership });
  return { userId: id, name, email, sessionId: "seed", memberships, administersHospitalIds: [] };
}

/** Everybody the demo knows, as the ones who chart its stories. */
export async function hirePeople(hospital: Hospital, unitIds: Record<UnitKey, string>): Promise<Cast> {
  const passwordHash = await hashPassword(PASSWORD);
  const cast: Partial<Cast> = {};
  for (const [key, person] of Object.entries(people)) {
    cast[key as PersonKey] = await hire(person, unitIds, passwordHash);
  }
  const hired = cast as Cast;
  await HospitalAdministrator.create({ userId: hired.administrator.userId, hospitalId: hospital.id });
  return hired;
}
