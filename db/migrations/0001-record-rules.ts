import type { SchemaMigration } from "./migration";

/** What every append-only table leans on: the refusing trigger, the recording clock, and equality inside GiST. */
export const recordRules: SchemaMigration = {
  name: "0001-record-rules",
  sql: `
    CREATE EXTENSION IF NOT EXISTS btree_gist;

    CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
    BEGIN
      RAISE EXCEPTION '% of % is refused: what is recorded here is never changed or removed', TG_OP, TG_TABLE_NAME
        USING ERRCODE = 'restrict_violation', TABLE = TG_TABLE_NAME, CONSTRAINT = TG_NAME;
    END $$;

    -- The owner (seeds, the load generator) may say when something was recorded; everyone else gets the clock.
    CREATE FUNCTION set_recorded_at() RETURNS trigger LANGUAGE plpgsql AS $$
    BEGIN
      IF NEW.recorded_at IS NULL
         OR current_user <> (SELECT pg_get_userbyid(relowner) FROM pg_class WHERE oid = TG_RELID) THEN
        -- Cut to the column's milliseconds: rounding up would record a moment that has not come.
        NEW.recorded_at := date_trunc('milliseconds', clock_timestamp());
      END IF;
      RETURN NEW;
    END $$;
  `,
};
