import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "@/db/connection";

/** Tells every listening server, at commit, that what it holds of this unit or patient is old. */
export async function announceChart(
  { unitId, patientId }: { unitId: string; patientId: string },
  transaction: Transaction,
): Promise<void> {
  await sequelize.query("SELECT pg_notify('neaptide_chart', $payload)", {
    type: QueryTypes.SELECT,
    bind: { payload: JSON.stringify({ unitId, patientId }) },
    transaction,
  });
}
