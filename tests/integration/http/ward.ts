import { HospitalAdministrator, type Unit, type User, type VentilationEpisode } from "@/db/models";
import { buildEpisode, buildHospital, buildMember, buildUnit, buildUser } from "../factories";

export const askers = ["therapist", "intensivist", "nurse", "administrator"] as const;

export type Asker = (typeof askers)[number];

export interface Ward {
  unit: Unit;
  /** A second unit of the same hospital, where none of these people work. */
  foreign: Unit;
  episode: VentilationEpisode;
  foreignEpisode: VentilationEpisode;
  people: Record<Asker, User>;
}

async function buildAdministrator(hospitalId: string): Promise<User> {
  const user = await buildUser();
  await HospitalAdministrator.create({ userId: user.id, hospitalId });
  return user;
}

/** Two units of one hospital with a patient each, one person of each role in the first, and the administrator. */
export async function buildWard(policy: { nursesSetVentilators?: boolean } = {}): Promise<Ward> {
  const hospital = await buildHospital();
  const unit = await buildUnit({ hospitalId: hospital.id }, policy);
  const foreign = await buildUnit({ hospitalId: hospital.id }, policy);
  return {
    unit,
    foreign,
    episode: await buildEpisode({ unitId: unit.id }),
    foreignEpisode: await buildEpisode({ unitId: foreign.id }),
    people: {
      therapist: await buildMember(unit.id, "therapist"),
      intensivist: await buildMember(unit.id, "intensivist"),
      nurse: await buildMember(unit.id, "nurse"),
      administrator: await buildAdministrator(hospital.id),
    },
  };
}
