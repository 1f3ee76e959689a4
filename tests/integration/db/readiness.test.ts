import { afterEach, describe, expect, it } from "vitest";
import { withClient } from "../database";
import { readinessFaults } from "@/db/readiness";

const owner = (statement: string) =>
  withClient(process.env.TEST_DATABASE_OWNER_URL ?? "", (client) => client.query(statement));

const application = new URL(process.env.DATABASE_URL ?? "").username;

/** What each case undoes, so that the next one starts from a database without fault. */
let undo: string[] = [];

async function make(fault: string, mend: string): Promise<string[]> {
  await owner(fault);
  undo.push(mend);
  return readinessFaults();
}

afterEach(async () => {
  for (const statement of undo) await owner(statement);
  undo = [];
});

describe("readiness", () => {
  it("finds no fault in a database as migrated", async () => {
    expect(await readinessFaults()).toEqual([]);
  });

  it.each(["UPDATE", "DELETE", "TRUNCATE", "TRIGGER"])(
    "says that the application has %s on a chart table",
    async (right) => {
      const faults = await make(
        `GRANT ${right} ON mechanics_readings TO ${application}`,
        `REVOKE ${right} ON mechanics_readings FROM ${application}`,
      );
      expect(faults).toEqual([`the application's role has ${right} on mechanics_readings`]);
    },
  );

  it("says that the application has UPDATE on one column", async () => {
    const faults = await make(
      `GRANT UPDATE (plateau_cm_h2o) ON mechanics_readings TO ${application}`,
      `REVOKE UPDATE (plateau_cm_h2o) ON mechanics_readings FROM ${application}`,
    );
    expect(faults).toEqual(["the application's role has UPDATE on mechanics_readings"]);
  });

  it("says that everybody has a right on the audit", async () => {
    const faults = await make("GRANT DELETE ON audit_events TO PUBLIC", "REVOKE DELETE ON audit_events FROM PUBLIC");
    expect(faults).toEqual(["the application's role has DELETE on audit_events"]);
  });

  it.each(["DISABLE", "ENABLE", "ENABLE REPLICA"])("says that a refusing trigger is set to %s", async (state) => {
    const faults = await make(
      `ALTER TABLE submissions ${state} TRIGGER refuse_change`,
      "ALTER TABLE submissions ENABLE ALWAYS TRIGGER refuse_change",
    );
    expect(faults).toEqual(["the trigger that refuses changes of submissions is missing or not enabled always"]);
  });

  it("says that a refusing trigger no longer covers TRUNCATE", async () => {
    const faults = await make(
      `CREATE OR REPLACE TRIGGER refuse_change BEFORE UPDATE OR DELETE ON heights
         FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
       ALTER TABLE heights ENABLE ALWAYS TRIGGER refuse_change`,
      `CREATE OR REPLACE TRIGGER refuse_change BEFORE UPDATE OR DELETE OR TRUNCATE ON heights
         FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
       ALTER TABLE heights ENABLE ALWAYS TRIGGER refuse_change`,
    );
    expect(faults).toEqual(["the trigger that refuses changes of heights is missing or not enabled always"]);
  });

  it("says that a recorded_at trigger is off", async () => {
    const faults = await make(
      "ALTER TABLE chart_entries ENABLE TRIGGER set_recorded_at",
      "ALTER TABLE chart_entries ENABLE ALWAYS TRIGGER set_recorded_at",
    );
    expect(faults).toEqual(["the trigger that sets recorded_at of chart_entries is missing or not enabled always"]);
  });

  it("says that a new table has neither trigger, for whoever forgot it", async () => {
    const faults = await make("CREATE TABLE notes_kept (recorded_at timestamptz)", "DROP TABLE notes_kept");
    expect(faults).toEqual([
      "the trigger that refuses changes of notes_kept is missing or not enabled always",
      "the trigger that sets recorded_at of notes_kept is missing or not enabled always",
    ]);
  });

  it("says which migration has not run", async () => {
    const faults = await make(
      "DELETE FROM schema_migrations WHERE name = '0005-audit'",
      "INSERT INTO schema_migrations (name) VALUES ('0005-audit')",
    );
    expect(faults).toEqual(["migration 0005-audit has not run"]);
  });

  it("says that the application's role owns a table, or belongs to whoever does", async () => {
    const faults = await make(
      `GRANT CREATE ON SCHEMA public TO ${application}`,
      `REVOKE CREATE ON SCHEMA public FROM ${application}`,
    );
    expect(faults).toEqual([]);
    await withClient(process.env.DATABASE_URL ?? "", (client) => client.query("CREATE TABLE mine (id int)"));
    const owned = await readinessFaults();
    await withClient(process.env.DATABASE_URL ?? "", (client) => client.query("DROP TABLE mine"));
    expect(owned).toContain(`the application's role ${application} owns tables or belongs to their owner`);
  });
});
