import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "@/db/connection";

export interface LockedBed {
  id: string;
  label: string;
  /** Somebody lies there now. */
  taken: boolean;
}

/** The bed of this unit, locked, and only then looked at; null where the unit has no such bed. */
export async function lockBed(
  { unitId, bedId }: { unitId: string; bedId: string },
  transaction: Transaction,
): Promise<LockedBed | null> {
  const bind = { unitId, bedId };
  await sequelize.query("SELECT FROM beds WHERE id = $bedId::bigint AND unit_id = $unitId::bigint FOR UPDATE", {
    type: QueryTypes.SELECT,
    bind,
    transaction,
  });
  const [bed] = await sequelize.query<LockedBed>(
    `SELECT b.id::text AS id, b.label, EXISTS (
       SELECT FROM bed_stays s WHERE s.bed_id = b.id AND upper_inf(s.during)) AS taken
     FROM beds b WHERE b.id = $bedId::bigint AND b.unit_id = $unitId::bigint`,
    { type: QueryTypes.SELECT, bind, transaction },
  );
  return bed ?? null;
}

/** Begins a stay now, or where the bed's last one ended if a clock ran ahead; a bed taken meanwhile is refused here. */
export async function occupyBed(
  { episodeId, bedId, now }: { episodeId: string; bedId: string; now: Date },
  transaction: Transaction,
): Promise<void> {
  await sequelize.query(
    `INSERT INTO bed_stays (episode_id, bed_id, during)
     SELECT $episodeId::bigint, $bedId::bigint,
       tstzrange(GREATEST($now::timestamptz, (SELECT max(upper(s.during)) FROM bed_stays s WHERE s.bed_id = $bedId::bigint)), NULL)`,
    { bind: { episodeId, bedId, now }, transaction },
  );
  await sequelize.query("SET CONSTRAINTS ALL IMMEDIATE", { transaction });
}
