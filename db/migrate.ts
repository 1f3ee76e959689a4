import { realpathSync } from "node:fs";
import { fileURLToPath } from "node:url";
import pg from "pg";
import { Umzug } from "umzug";
import { migrationEnv } from "@/lib/env";
import { grantToApplication } from "./grants";
import { migrations } from "./migrations";
import type { SchemaMigration } from "./migrations/migration";
import { migrationsTable } from "./table-rights";

/** Any fixed number: two runs at once wait for one another. */
const ADVISORY_LOCK = 7_283_401_166;

interface MigrateOptions {
  appRole?: string;
  /** Tests migrate from an earlier release by naming its migrations. */
  only?: readonly SchemaMigration[];
}

async function inTransaction(client: pg.Client, run: () => Promise<unknown>): Promise<void> {
  await client.query("BEGIN");
  try {
    await run();
    await client.query("COMMIT");
  } catch (error) {
    await client.query("ROLLBACK");
    throw error;
  }
}

/** A migration and its line in the log stand or fall together. */
async function apply(client: pg.Client, { name, sql }: SchemaMigration): Promise<void> {
  await inTransaction(client, async () => {
    await client.query(sql);
    await client.query(`INSERT INTO ${migrationsTable} (name) VALUES ($1)`, [name]);
  });
}

function umzugFor(client: pg.Client, steps: readonly SchemaMigration[]) {
  return new Umzug({
    migrations: steps.map((step) => ({ name: step.name, up: () => apply(client, step) })),
    context: client,
    logger: undefined,
    storage: {
      // Written by `apply`, inside the migration's own transaction.
      logMigration: async () => undefined,
      unlogMigration: async ({ name }) => {
        throw new Error(`${name} cannot be undone: migrations only go forward.`);
      },
      executed: async () => {
        const { rows } = await client.query<{ name: string }>(`SELECT name FROM ${migrationsTable} ORDER BY name`);
        return rows.map((row) => row.name);
      },
    },
  });
}

/** Brings the database at `url` (its owner's address) to this release. Answers the names of what ran. */
export async function migrate(
  url: string,
  { appRole = "neaptide_app", only = migrations }: MigrateOptions = {},
): Promise<string[]> {
  const client = new pg.Client({ connectionString: url, application_name: "neaptide migrate" });
  await client.connect();
  try {
    // Held by the session, so that it ends with the connection whatever happens.
    await client.query("SELECT pg_advisory_lock($1)", [ADVISORY_LOCK]);
    await client.query("SET client_min_messages = warning");
    await client.query(
      `CREATE TABLE IF NOT EXISTS ${migrationsTable} (
         name text CONSTRAINT schema_migrations_pk PRIMARY KEY,
         run_at timestamptz(3) NOT NULL DEFAULT clock_timestamp())`,
    );
    const done = await umzugFor(client, only).up();
    await inTransaction(client, () => grantToApplication(client, appRole));
    return done.map(({ name }) => name);
  } finally {
    await client.end();
  }
}

async function runFromCommandLine(): Promise<void> {
  try {
    const { MIGRATION_DATABASE_URL, APP_DATABASE_ROLE } = migrationEnv();
    const done = await migrate(MIGRATION_DATABASE_URL, { appRole: APP_DATABASE_ROLE });
    console.log(done.length > 0 ? `Migrated: ${done.join(", ")}.` : "The database is up to date.");
  } catch (error) {
    console.error(`The database was not migrated: ${error instanceof Error ? reasonOf(error) : String(error)}`);
    process.exitCode = 1;
  }
}

/** umzug names the migration and wraps what PostgreSQL said. */
function reasonOf(error: Error): string {
  return error.message || (error as NodeJS.ErrnoException).code || error.name;
}

const invoked = process.argv[1];
if (invoked && realpathSync(invoked) === fileURLToPath(import.meta.url)) await runFromCommandLine();
