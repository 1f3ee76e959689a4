import pg from "pg";
import { pino } from "pino";
import { Sequelize } from "sequelize";
import { env, poolEnv } from "@/lib/env";
import { databaseAddress } from "./database-address";
import { readNumericAsNumber } from "./numbers-from-postgres";

function logStatements(): (statement: string) => void {
  const log = pino({ name: "sql", base: null });
  return (statement) => log.info(statement);
}

function connect(): Sequelize {
  readNumericAsNumber();
  const { DATABASE_POOL_MAX, DATABASE_LOG_SQL } = poolEnv();
  return new Sequelize({
    dialect: "postgres",
    dialectModule: pg,
    pool: { max: DATABASE_POOL_MAX, min: 0, acquire: 20_000, idle: 10_000 },
    logging: DATABASE_LOG_SQL === "1" ? logStatements() : false,
    define: { timestamps: false, underscored: true, freezeTableName: true },
    hooks: {
      // The address is read at the first connection: `next build` imports this module without a database.
      beforeConnect(config) {
        const { encrypted, ...address } = databaseAddress(env().DATABASE_URL);
        Object.assign(config, address, encrypted && { dialectOptions: { ssl: { rejectUnauthorized: true } } });
      },
    },
  });
}

const shared = globalThis as typeof globalThis & { neaptideDatabase?: Sequelize };

/** One pool a process. It survives hot reloading; the models bind to it anew at each load. */
export const sequelize: Sequelize = (shared.neaptideDatabase ??= connect());
