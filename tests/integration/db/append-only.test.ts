import { beforeAll, describe, expect, it } from "vitest";
import { withClient } from "../database";
import { buildEntry, buildSubmission, buildUnit } from "../factories";
import {
  Acknowledgement,
  AuditEvent,
  Height,
  MechanicsReading,
  Observation,
  SettingChange,
  SettingsCheck,
  TargetOrder,
} from "@/db/models";

/** The mutable tables of the architecture. Every other table in the catalogue must refuse, a new one included. */
const mutable = [
  "hospitals",
  "units",
  "ventilation_episodes",
  "episode_pauses",
  "patients",
  "beds",
  "bed_stays",
  "users",
  "sessions",
  "unit_memberships",
  "hospital_administrators",
  "sign_in_attempts",
];
const migrationsLog = "schema_migrations";

const expected = [
  "acknowledgements",
  "audit_events",
  "chart_entries",
  "heights",
  "mechanics_readings",
  "observations",
  "setting_changes",
  "settings_checks",
  "submissions",
  "target_orders",
  "unit_policies",
];

const owner = () => process.env.TEST_DATABASE_OWNER_URL ?? "";
const application = () => process.env.DATABASE_URL ?? "";

interface Table {
  name: string;
  /** Any column: the trigger refuses the statement, whatever it would change. */
  column: string;
}

async function tables(): Promise<Table[]> {
  return withClient(owner(), async (client) => {
    const { rows } = await client.query<Table>(
      `SELECT c.relname AS name, a.attname AS column FROM pg_class c
         JOIN pg_attribute a ON a.attrelid = c.oid AND a.attnum = 1
        WHERE c.relnamespace = 'public'::regnamespace AND c.relkind IN ('r', 'p') ORDER BY 1`,
    );
    return rows;
  });
}

const appendOnly = async () => (await tables()).filter(({ name }) => ![...mutable, migrationsLog].includes(name));

/** What PostgreSQL answered to each statement: an error's code, or 'done'. Whatever it did is rolled back. */
async function answersTo(url: string, statements: readonly string[]): Promise<Record<string, string>> {
  return withClient(url, async (client) => {
    const answers: Record<string, string> = {};
    for (const statement of statements) {
      await client.query("BEGIN");
      answers[statement] = await client.query(statement).then(
        () => "done",
        (error: { code: string }) => error.code,
      );
      await client.query("ROLLBACK");
    }
    return answers;
  });
}

const all = (statements: readonly string[], answer: string) =>
  Object.fromEntries(statements.map((statement) => [statement, answer]));

const statements = ({ name, column }: Table) => [
  `UPDATE ${name} SET ${column} = DEFAULT`,
  `UPDATE ${name} SET ${column} = DEFAULT WHERE false`,
  `DELETE FROM ${name}`,
  `DELETE FROM ${name} WHERE false`,
  `TRUNCATE ${name} CASCADE`,
];

const count = async (name: string) =>
  withClient(owner(), async (client) => {
    const { rows } = await client.query<{ count: string }>(`SELECT count(*) FROM ${name}`);
    return Number(rows[0]?.count);
  });

beforeAll(async () => {
  await buildUnit();
  const entry = (kind: string) => buildEntry({ kind });
  await SettingChange.create({ entryId: (await entry("settings")).id, peepCmH2O: 10 });
  await SettingsCheck.create({ entryId: (await entry("settings-checks")).id });
  await MechanicsReading.create({ entryId: (await entry("mechanics")).id, plateauCmH2O: 24 });
  await Observation.create({ entryId: (await entry("observations")).id, spo2Percent: 93 });
  await Height.create({
    entryId: (await entry("heights")).id,
    method: "measured-lying",
    sexForPbw: "male",
    heightCm: 175,
  });
  await TargetOrder.create({ entryId: (await entry("targets")).id, targets: {} });
  await Acknowledgement.create({
    entryId: (await entry("acknowledgements")).id,
    metric: "plateauCmH2O",
    value: 31,
    until: new Date(),
    note: "Volume down",
  });
  await AuditEvent.create({ action: "test" });
  await buildSubmission();
});

describe("the record", () => {
  it("is made of the append-only tables of the catalogue, none of them empty here", async () => {
    const found = await appendOnly();
    expect(found.map(({ name }) => name)).toEqual(expected);
    for (const { name } of found) expect(await count(name), name).toBeGreaterThan(0);
  });

  it("is every table with a column entry_id, and no mutable table has one", async () => {
    const withEntry = await withClient(owner(), async (client) => {
      const { rows } = await client.query<{ name: string }>(
        "SELECT table_name AS name FROM information_schema.columns WHERE table_schema = 'public' AND column_name = 'entry_id'",
      );
      return rows.map(({ name }) => name);
    });
    expect(withEntry.length).toBeGreaterThan(0);
    expect(withEntry.filter((name) => mutable.includes(name))).toEqual([]);
  });

  it("refuses UPDATE, DELETE and TRUNCATE to the application, which has no such right", async () => {
    const changes = (await appendOnly()).flatMap(statements);
    expect(await answersTo(application(), changes)).toEqual(all(changes, "42501"));
  });

  it("refuses UPDATE, DELETE and TRUNCATE to the owner too, by trigger", async () => {
    const changes = (await appendOnly()).flatMap(statements);
    expect(await answersTo(owner(), changes)).toEqual(all(changes, "23001"));
  });

  it("refuses row locks that would only serve a change, and leaves the episode's lock", async () => {
    const [chart, episode] = [
      "SELECT FROM chart_entries FOR UPDATE",
      "SELECT FROM ventilation_episodes FOR NO KEY UPDATE",
    ];
    expect(await answersTo(application(), [chart, episode])).toEqual({ [chart]: "42501", [episode]: "done" });
  });

  it("holds its triggers under session_replication_role replica: all of them are enabled ALWAYS", async () => {
    const enabled = await withClient(owner(), async (client) => {
      const { rows } = await client.query<{ name: string; enabled: string }>(
        `SELECT c.relname || '.' || t.tgname AS name, t.tgenabled AS enabled FROM pg_trigger t
           JOIN pg_class c ON c.oid = t.tgrelid WHERE NOT t.tgisinternal`,
      );
      return rows;
    });
    expect(enabled.length).toBeGreaterThan(expected.length);
    expect(enabled.filter((trigger) => trigger.enabled !== "A")).toEqual([]);
  });

  it("cannot be switched off by the application", async () => {
    const attempts = [
      "ALTER TABLE chart_entries DISABLE TRIGGER ALL",
      "SET session_replication_role = replica",
      "DROP TABLE settings_checks",
      "CREATE TABLE elsewhere (id int)",
      "CREATE OR REPLACE FUNCTION refuse_change() RETURNS trigger LANGUAGE sql AS ''",
    ];
    expect(await answersTo(application(), attempts)).toEqual(all(attempts, "42501"));
  });

  it("goes with no row of a mutable table: what it refers to cannot be removed either", async () => {
    const [one, whole] = ["DELETE FROM ventilation_episodes", "TRUNCATE ventilation_episodes CASCADE"];
    expect(await answersTo(owner(), [one, whole])).toEqual({ [one]: "23503", [whole]: "23001" });
  });
});

describe("the application's rights", () => {
  const privileges = () =>
    withClient(application(), async (client) => {
      const { rows } = await client.query<{ name: string; rights: string[]; updates: string[] | null }>(
        `SELECT c.relname AS name,
                ARRAY(SELECT p FROM unnest(ARRAY['SELECT','INSERT','UPDATE','DELETE','TRUNCATE','REFERENCES','TRIGGER']) p
                       WHERE has_table_privilege(c.oid, p)) AS rights,
                ARRAY(SELECT a.attname::text FROM pg_attribute a WHERE a.attrelid = c.oid AND a.attnum > 0 AND NOT a.attisdropped
                         AND has_column_privilege(c.oid, a.attnum, 'UPDATE') ORDER BY 1) AS updates
           FROM pg_class c WHERE c.relnamespace = 'public'::regnamespace AND c.relkind IN ('r', 'p') ORDER BY 1`,
      );
      return rows;
    });

  it("are SELECT and INSERT everywhere, UPDATE on the mutable tables, DELETE only on sign-in attempts", async () => {
    const columnsOnly = ["users", "sessions", "unit_memberships"];
    for (const { name, rights } of await privileges()) {
      const updates = mutable.includes(name) && !columnsOnly.includes(name) ? ["UPDATE"] : [];
      const deletes = name === "sign_in_attempts" ? ["DELETE"] : [];
      const allowed = name === migrationsLog ? ["SELECT"] : ["SELECT", "INSERT", ...updates, ...deletes];
      expect(rights, name).toEqual(allowed);
    }
  });

  it("change of a person, a session and a membership only what may change", async () => {
    const updates = Object.fromEntries((await privileges()).map((table) => [table.name, table.updates]));
    expect(updates.users).toEqual(["session_version"]);
    expect(updates.sessions).toEqual(["ended_at", "last_action_at"]);
    expect(updates.unit_memberships).toEqual(["lead", "role"]);
  });
});
