import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "@/db/connection";

export interface LockedEpisode {
  intubatedAt: Date;
  endedAt: Date | null;
}

/**
 * The one lock of the chart: whoever writes to an episode waits here, and only then reads what stands. NO KEY leaves
 * room for the foreign keys of entries that others are inserting.
 */
export async function lockEpisode(episodeId: string, transaction: Transaction): Promise<LockedEpisode> {
  const [episode] = await sequelize.query<LockedEpisode>(
    `SELECT intubated_at AS "intubatedAt", ended_at AS "endedAt" FROM ventilation_episodes
     WHERE id = $episodeId::bigint FOR NO KEY UPDATE`,
    { type: QueryTypes.SELECT, bind: { episodeId }, transaction },
  );
  if (!episode) throw new Error(`episode ${episodeId} was granted and is not there`);
  return episode;
}
