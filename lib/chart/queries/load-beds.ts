import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "@/db/connection";

export interface BedWithEpisode {
  id: string;
  label: string;
  sortOrder: number;
  /** The open episode that lies there now; null in a free bed. */
  episodeId: string | null;
}

const statement = `
  SELECT b.id::text AS id, b.label, b.sort_order AS "sortOrder", v.id::text AS "episodeId"
  FROM beds b
    LEFT JOIN bed_stays s ON s.bed_id = b.id AND upper_inf(s.during)
    LEFT JOIN ventilation_episodes v ON v.id = s.episode_id AND v.ended_at IS NULL
  WHERE b.unit_id = $unitId::bigint
  ORDER BY b.sort_order, b.id`;

export async function loadBeds(unitId: string, transaction: Transaction): Promise<BedWithEpisode[]> {
  return sequelize.query<BedWithEpisode>(statement, { type: QueryTypes.SELECT, bind: { unitId }, transaction });
}
