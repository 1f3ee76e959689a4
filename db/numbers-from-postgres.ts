import { DataTypes } from "sequelize";

/** Sequelize keeps its PostgreSQL types here and leaves them out of its declarations. */
interface PostgresTypes {
  DECIMAL: { parse: (value: string) => unknown };
}

/**
 * NUMERIC becomes a number: no charted value has more digits than a double holds. BIGINT, and so every id and count(*),
 * stays a string, and a date without time stays 'YYYY-MM-DD'. Sequelize would leave NUMERIC a string too.
 */
export function readNumericAsNumber(): void {
  const { postgres } = DataTypes as unknown as { postgres: PostgresTypes };
  postgres.DECIMAL.parse = Number;
}
