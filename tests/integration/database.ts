import { createHash, randomBytes } from "node:crypto";
import pg from "pg";
import { migrate } from "@/db/migrate";
import { migrations } from "@/db/migrations";
import { deletable, updatable } from "@/db/table-rights";

/** Two workers that both find no template must not both make it, nor drop it while another copies it. */
const TEMPLATE_LOCK = 7_283_401_167;
const TEMPLATE = "neaptide_template_";

export interface TestDatabase {
  name: string;
  /** The owner's address: migrations, seeds, and tests that the owner too is refused. */
  ownerUrl: string;
  /** The application's address: what DATABASE_URL is. */
  appUrl: string;
  drop: () => Promise<void>;
}

function address(variable: "TEST_DATABASE_ADMIN_URL" | "TEST_DATABASE_APP_URL"): string {
  const url = process.env[variable];
  if (!url) throw new Error(`${variable} is not set: integration tests need a PostgreSQL cluster. Run npm test.`);
  return url;
}

function inDatabase(url: string, name: string): string {
  const changed = new URL(url);
  changed.pathname = `/${name}`;
  return changed.href;
}

/** Runs as the owner role in the cluster's maintenance database. */
async function asAdministrator<Result>(run: (client: pg.Client) => Promise<Result>): Promise<Result> {
  const client = new pg.Client({ connectionString: address("TEST_DATABASE_ADMIN_URL") });
  await client.connect();
  try {
    return await run(client);
  } finally {
    await client.end();
  }
}

const appRole = () => decodeURIComponent(new URL(address("TEST_DATABASE_APP_URL")).username);

/** Changes with the schema, so that a kept cluster never serves an old one. */
function templateName(): string {
  const schema = JSON.stringify([migrations, updatable, deletable, appRole()]);
  return TEMPLATE + createHash("sha256").update(schema).digest("hex").slice(0, 16);
}

async function databasesLike(client: pg.Client, prefix: string): Promise<string[]> {
  const { rows } = await client.query<{ datname: string }>(
    "SELECT datname FROM pg_database WHERE starts_with(datname, $1)",
    [prefix],
  );
  return rows.map(({ datname }) => datname);
}

async function ensureTemplate(client: pg.Client): Promise<string> {
  const name = templateName();
  const present = await databasesLike(client, TEMPLATE);
  if (present.includes(name)) return name;
  for (const old of present) await client.query(`DROP DATABASE "${old}"`);
  // Renamed when complete: one whose making was interrupted is dropped as old by the next run.
  const draft = `${TEMPLATE}draft`;
  await client.query(`CREATE DATABASE "${draft}"`);
  await migrate(inDatabase(address("TEST_DATABASE_ADMIN_URL"), draft), { appRole: appRole() });
  await client.query(`ALTER DATABASE "${draft}" RENAME TO "${name}"`);
  return name;
}

function databaseNamed(name: string): TestDatabase {
  return {
    name,
    ownerUrl: inDatabase(address("TEST_DATABASE_ADMIN_URL"), name),
    appUrl: inDatabase(address("TEST_DATABASE_APP_URL"), name),
    drop: () => asAdministrator((client) => dropDatabase(client, name)),
  };
}

const freshName = () => `neaptide_test_${process.pid}_${randomBytes(4).toString("hex")}`;

/** A migrated database of its own: chart tables cannot be emptied, so each test file starts from a copy. */
export function createTestDatabase(): Promise<TestDatabase> {
  return asAdministrator(async (client) => {
    await client.query("SELECT pg_advisory_lock($1)", [TEMPLATE_LOCK]);
    const template = await ensureTemplate(client);
    const database = databaseNamed(freshName());
    await client.query(`CREATE DATABASE "${database.name}" TEMPLATE "${template}"`);
    return database;
  });
}

/** An empty database, for tests of the migrations themselves. */
export function createEmptyDatabase(): Promise<TestDatabase> {
  return asAdministrator(async (client) => {
    const database = databaseNamed(freshName());
    await client.query(`CREATE DATABASE "${database.name}"`);
    return database;
  });
}

/** Runs statements over a connection of its own and closes it. */
export async function withClient<Result>(url: string, run: (client: pg.Client) => Promise<Result>): Promise<Result> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return await run(client);
  } finally {
    await client.end();
  }
}

const INSUFFICIENT_PRIVILEGE = "42501";
const dropTries = 50;

/** The owner may not end PostgreSQL's own autovacuum worker, which may be at work in there: it leaves by itself. */
async function dropDatabase(client: pg.Client, name: string): Promise<void> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      await client.query(`DROP DATABASE IF EXISTS "${name}" WITH (FORCE)`);
      return;
    } catch (error) {
      const busy = (error as { code?: string }).code === INSUFFICIENT_PRIVILEGE;
      if (!busy || attempt === dropTries) throw error;
      await new Promise((done) => setTimeout(done, 200));
    }
  }
}
