import { Op } from "sequelize";
import { Bed, BedStay, EpisodePause, VentilationEpisode } from "@/db/models";
import type { Actor } from "./context";

const DAY_MS = 24 * 60 * 60_000;

/** An ended episode stays with the unit where it ran for this long; then with its lead. */
const ENDED_SEEN_MS = 7 * DAY_MS;

export type VisibleEpisode = VentilationEpisode & {
  pauses: EpisodePause[];
  bedStays: (BedStay & { bed: Bed })[];
};

function whereSeen({ memberships }: Actor, patientId: string, now: Date) {
  const leads = memberships.filter(({ lead }) => lead).map(({ unitId }) => unitId);
  return {
    patientId,
    unitId: memberships.map(({ unitId }) => unitId),
    [Op.or]: [{ endedAt: null }, { endedAt: { [Op.gt]: new Date(now.getTime() - ENDED_SEEN_MS) } }, { unitId: leads }],
  };
}

/**
 * The newest episode of a patient that ran in one of this person's units, with its open pause and its bed now; null
 * alike for a patient who does not exist and for one of another unit.
 */
export async function visibleEpisode(actor: Actor, patientId: string, now: Date): Promise<VisibleEpisode | null> {
  if (actor.memberships.length === 0) return null;
  const episode = await VentilationEpisode.findOne({
    where: whereSeen(actor, patientId, now),
    include: [
      { model: EpisodePause, as: "pauses", where: { resumedAt: null }, required: false },
      {
        model: BedStay,
        as: "bedStays",
        where: { during: { [Op.contains]: now } },
        required: false,
        include: [{ model: Bed, as: "bed" }],
      },
    ],
    order: [
      ["intubatedAt", "DESC"],
      ["id", "DESC"],
    ],
  });
  return episode as VisibleEpisode | null;
}
