import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { createEmptyDatabase, withClient, type TestDatabase } from "../database";
import { migrate } from "@/db/migrate";
import { migrations } from "@/db/migrations";

let database: TestDatabase;

beforeEach(async () => {
  database = await createEmptyDatabase();
});

afterEach(async () => {
  await database.drop();
});

const rows = <Row extends object>(statement: string) =>
  withClient(database.ownerUrl, async (client) => (await client.query<Row>(statement)).rows);

const names = migrations.map(({ name }) => name);

const schemaObjects = `
  SELECT c.relname || ':' || c.relkind::text AS object FROM pg_class c WHERE c.relnamespace = 'public'::regnamespace
  UNION SELECT conrelid::regclass::text || ':' || conname || ':' || pg_get_constraintdef(oid) FROM pg_constraint WHERE connamespace = 'public'::regnamespace
  UNION SELECT c.relname || ':' || c.relacl::text FROM pg_class c WHERE c.relnamespace = 'public'::regnamespace AND c.relacl IS NOT NULL
  ORDER BY 1`;

describe("migrations", () => {
  it("bring an empty database to this release, in order, and log each", async () => {
    expect(await migrate(database.ownerUrl)).toEqual(names);
    const logged = await rows<{ name: string }>("SELECT name FROM schema_migrations ORDER BY name");
    expect(logged.map(({ name }) => name)).toEqual(names);
  });

  it("run once: a second run does nothing and leaves the same schema and the same grants", async () => {
    await migrate(database.ownerUrl);
    const before = await rows(schemaObjects);
    expect(await migrate(database.ownerUrl)).toEqual([]);
    expect(await rows(schemaObjects)).toEqual(before);
    expect(before.length).toBeGreaterThan(100);
  });

  it("reach the same schema from every earlier migration as from nothing", async () => {
    for (let done = 1; done < migrations.length; done += 1) {
      const step = await migrate(database.ownerUrl, { only: migrations.slice(0, done) });
      expect(step).toEqual([names[done - 1]]);
    }
    await migrate(database.ownerUrl);
    const stepwise = await rows(schemaObjects);
    const fresh = await createEmptyDatabase();
    try {
      await migrate(fresh.ownerUrl);
      const atOnce = await withClient(fresh.ownerUrl, async (client) => (await client.query(schemaObjects)).rows);
      expect(stepwise).toEqual(atOnce);
    } finally {
      await fresh.drop();
    }
  });

  it("wait for one another: of two runs at once each migration runs in one", async () => {
    const both = await Promise.all([migrate(database.ownerUrl), migrate(database.ownerUrl)]);
    expect(both.flat()).toEqual(names);
  });

  it("leave nothing of one that fails, and keep those before it", async () => {
    const broken = { name: "9999-broken", sql: "CREATE TABLE half_done (id int); SELECT 1 / 0" };
    await expect(migrate(database.ownerUrl, { only: [...migrations, broken] })).rejects.toThrow("division by zero");
    const tables = await rows<{ found: string | null }>("SELECT to_regclass('public.half_done')::text AS found");
    expect(tables).toEqual([{ found: null }]);
    expect(await rows("SELECT name FROM schema_migrations")).toHaveLength(names.length);
  });

  it("say which role is missing where the owner may not make it", async () => {
    await expect(migrate(database.ownerUrl, { appRole: "neaptide_nobody" })).rejects.toThrow(
      /role neaptide_nobody does not exist.*CREATE ROLE neaptide_nobody/,
    );
  });

  it("name every constraint: none carries a name that PostgreSQL made up", async () => {
    await migrate(database.ownerUrl);
    const constraints = await rows<{ name: string }>(
      "SELECT conname AS name FROM pg_constraint WHERE connamespace = 'public'::regnamespace AND contype <> 't'",
    );
    expect(constraints.length).toBeGreaterThan(100);
    expect(constraints.filter(({ name }) => !/_(pk|fk|uq|ck|ex)$/.test(name))).toEqual([]);
  });

  it("leave a stranger's role without any right in the schema", async () => {
    await migrate(database.ownerUrl);
    const open = await rows<{ name: string }>(
      `SELECT relname AS name FROM pg_class, aclexplode(relacl) a
        WHERE relnamespace = 'public'::regnamespace AND a.grantee = 0`,
    );
    expect(open).toEqual([]);
  });
});
