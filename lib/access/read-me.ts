import { Op } from "sequelize";
import { Bed, BedStay, Session, Unit, UnitPolicy, VentilationEpisode } from "@/db/models";
import type { Me } from "@/lib/contracts";
import type { Actor, Ctx } from "./context";
import { SESSION_MS } from "./session";

type UnitWithBeds = Unit & { beds: Bed[] };

/** Units this person belongs to, and those of a hospital they administer, with their beds in order. */
async function unitsOf({ memberships, administersHospitalIds }: Actor, { transaction }: Ctx): Promise<UnitWithBeds[]> {
  const units = await Unit.findAll({
    where: {
      [Op.or]: [{ id: memberships.map(({ unitId }) => unitId) }, { hospitalId: [...administersHospitalIds] }],
    },
    include: [{ model: Bed, as: "beds" }],
    order: ["name", "id", [{ model: Bed, as: "beds" }, "sortOrder", "ASC"]],
    transaction,
  });
  return units as UnitWithBeds[];
}

/** Who lies in which bed now, of the units this person belongs to: an administrator sees beds without patients. */
async function patientsByBed(unitIds: string[], { now, transaction }: Ctx): Promise<Map<string, string>> {
  const stays = await BedStay.findAll({
    attributes: ["bedId", "episodeId"],
    where: { during: { [Op.contains]: now } },
    include: [{ model: Bed, as: "bed", attributes: [], where: { unitId: unitIds } }],
    transaction,
  });
  const episodes = await VentilationEpisode.findAll({
    attributes: ["id", "patientId"],
    where: { id: stays.map(({ episodeId }) => episodeId), endedAt: null },
    transaction,
  });
  const patients = new Map(episodes.map(({ id, patientId }) => [id, patientId]));
  return new Map(stays.flatMap(({ bedId, episodeId }) => pair(bedId, patients.get(episodeId))));
}

const pair = (bedId: string, patientId: string | undefined): [string, string][] =>
  patientId === undefined ? [] : [[bedId, patientId]];

async function policyOf(unitId: string, { transaction }: Ctx): Promise<UnitPolicy> {
  return UnitPolicy.findOne({
    attributes: ["timeZone", "gasUnit"],
    where: { unitId },
    order: [
      ["recordedAt", "DESC"],
      ["id", "DESC"],
    ],
    rejectOnEmpty: true,
    transaction,
  });
}

/** Who is signed in, until when, and where: what a screen needs before it asks for anything else. */
export async function readMe(ctx: Ctx): Promise<Me> {
  const { actor, transaction } = ctx;
  const session = await Session.findByPk(actor.sessionId, { transaction, rejectOnEmpty: true });
  const units = await unitsOf(actor, ctx);
  const patients = await patientsByBed(
    actor.memberships.map(({ unitId }) => unitId),
    ctx,
  );
  const described: Me["units"] = [];
  for (const unit of units) {
    const { timeZone, gasUnit } = await policyOf(unit.id, ctx);
    const mine = actor.memberships.find(({ unitId }) => unitId === unit.id);
    const beds = unit.beds.map(({ id, label }) => ({ id, label, patientId: patients.get(id) ?? null }));
    const { id, name } = unit;
    described.push({ id, name, timeZone, gasUnit, role: mine?.role ?? null, lead: mine?.lead ?? false, beds });
  }
  return {
    user: { id: actor.userId, name: actor.name, email: actor.email },
    administrator: actor.administersHospitalIds.length > 0,
    session: {
      endsAt: new Date(session.createdAt.getTime() + SESSION_MS).toISOString(),
      lastActionAt: session.lastActionAt.toISOString(),
    },
    units: described,
  };
}
