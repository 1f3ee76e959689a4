import { Transaction } from "sequelize";
import { sequelize } from "@/db/connection";

/** One transaction a request. READ COMMITTED: who waited for a racing twin must see what it left. */
export function inTransaction<Result>(run: (transaction: Transaction) => Promise<Result>): Promise<Result> {
  return sequelize.transaction({ isolationLevel: Transaction.ISOLATION_LEVELS.READ_COMMITTED }, run);
}
