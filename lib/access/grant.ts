import { Unit } from "@/db/models";
import { AppError, idSchema } from "@/lib/contracts";
import { administratorCan, can } from "./can";
import type { Actor } from "./context";
import type { GrantOf, HospitalRow, PatientRow, RowOf, UnitRow } from "./granted";
import { rights, type Right, type RightScope } from "./rights";
import { unitRow } from "./unit-row";
import { visibleEpisode } from "./visible-episode";

export interface Asker {
  actor: Actor;
  now: Date;
}

/** Where the row is named: by the path, or for an admission by the body. */
export interface Named {
  params: unknown;
  json: () => Promise<unknown>;
}

const notFound = () => new AppError("not-found", "Nothing is found at this address.");
const noRight = () => new AppError("forbidden", "Your role in this unit may not do this.");

function holding<Row extends UnitRow>(row: Row, right: Right): Row {
  if (!can(row.member, right, row.policy)) throw noRight();
  return row;
}

function idIn(values: unknown, name: string): string | null {
  const id = idSchema.safeParse((values as Record<string, unknown> | null | undefined)?.[name]);
  return id.success ? id.data : null;
}

/** Missing, of another unit, and not a member of any: one answer, so that nobody learns who lies elsewhere. */
async function patientOf({ actor, now }: Asker, right: Right, patientId: string | null): Promise<PatientRow> {
  const episode = patientId === null ? null : await visibleEpisode(actor, patientId, now);
  const membership = actor.memberships.find(({ unitId }) => unitId === episode?.unitId);
  if (!episode || !membership) throw notFound();
  const bed = episode.endedAt ? undefined : episode.bedStays[0]?.bed;
  return holding(
    {
      ...(await unitRow(membership)),
      patientId: episode.patientId,
      episodeId: episode.id,
      intubatedAt: episode.intubatedAt,
      endedAt: episode.endedAt,
      pausedSince: episode.pauses[0]?.pausedAt ?? null,
      bed: bed ? { id: bed.id, label: bed.label } : null,
    },
    right,
  );
}

async function unitOf({ actor }: Asker, right: Right, unitId: string | null): Promise<UnitRow> {
  const membership = actor.memberships.find((mine) => mine.unitId === unitId);
  if (membership) return holding(await unitRow(membership), right);
  // An administrator knows the hospital's units by name, and may see none of their patients.
  const administered = unitId !== null && (await administers(actor, unitId));
  throw administered ? noRight() : notFound();
}

async function administers({ administersHospitalIds }: Actor, unitId: string): Promise<boolean> {
  if (administersHospitalIds.length === 0) return false;
  return (await Unit.count({ where: { id: unitId, hospitalId: [...administersHospitalIds] } })) > 0;
}

/** The unit stands in the body. Null where it is no id: the body's schema refuses that, beside whatever else is wrong. */
async function admittingUnitOf(asker: Asker, right: Right, json: () => Promise<unknown>): Promise<UnitRow | null> {
  const holder = asker.actor.memberships.some((member) => can(member, right, { nursesSetVentilators: false }));
  if (!holder) throw noRight();
  const unitId = idIn(await json(), "unitId");
  return unitId === null ? null : unitOf(asker, right, unitId);
}

function hospitalsOf({ actor }: Asker, right: Right): HospitalRow {
  const hospitalIds = actor.administersHospitalIds;
  if (hospitalIds.length === 0 || !administratorCan(right)) throw noRight();
  return { hospitalIds };
}

async function rowOf(right: Right, asker: Asker, { params, json }: Named): Promise<RowOf<RightScope> | null> {
  switch (rights[right].scope) {
    case "self":
      return { actor: asker.actor };
    case "patient":
      return patientOf(asker, right, idIn(params, "patientId"));
    case "unit":
      return unitOf(asker, right, idIn(params, "unitId"));
    case "admission":
      return admittingUnitOf(asker, right, json);
    case "hospital":
      return hospitalsOf(asker, right);
  }
}

/**
 * Grants a right on the row that a request names, or refuses: 404 for what this person may not know of, 403 for what
 * they know of and may not do. The one place where a row becomes a granted row; its scope comes from the database.
 */
export async function grant<Held extends Right>(
  right: Held,
  asker: Asker,
  named: Named,
): Promise<GrantOf<Held> | null> {
  return (await rowOf(right, asker, named)) as GrantOf<Held> | null;
}
