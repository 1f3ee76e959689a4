import type { SchemaMigration } from "./migration";
import { appendOnly, recordedByServerClock, wordColumn } from "./sql";

const places = `
  CREATE TABLE hospitals (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT hospitals_pk PRIMARY KEY,
    name text NOT NULL CONSTRAINT hospitals_name_uq UNIQUE CONSTRAINT hospitals_name_ck CHECK (length(name) BETWEEN 1 AND 200)
  );

  CREATE TABLE units (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT units_pk PRIMARY KEY,
    hospital_id bigint NOT NULL CONSTRAINT units_hospital_fk REFERENCES hospitals,
    name text NOT NULL CONSTRAINT units_name_ck CHECK (length(name) BETWEEN 1 AND 100),
    CONSTRAINT units_hospital_name_uq UNIQUE (hospital_id, name)
  );

  -- A label is unique in its unit; beds are listed by sort_order.
  CREATE TABLE beds (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT beds_pk PRIMARY KEY,
    unit_id bigint NOT NULL CONSTRAINT beds_unit_fk REFERENCES units,
    label text NOT NULL CONSTRAINT beds_label_ck CHECK (length(label) BETWEEN 1 AND 20),
    sort_order integer NOT NULL,
    CONSTRAINT beds_unit_label_uq UNIQUE (unit_id, label)
  );`;

const people = `
  CREATE TABLE users (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT users_pk PRIMARY KEY,
    email text NOT NULL CONSTRAINT users_email_uq UNIQUE
      CONSTRAINT users_email_ck CHECK (email = lower(btrim(email)) AND length(email) BETWEEN 3 AND 254),
    name text NOT NULL CONSTRAINT users_name_ck CHECK (length(name) BETWEEN 1 AND 200),
    title text CONSTRAINT users_title_ck CHECK (length(title) BETWEEN 1 AND 40),
    -- None until an invitation has been answered.
    password_hash text,
    -- Raising it ends every session that began under the older one.
    session_version integer NOT NULL DEFAULT 1 CONSTRAINT users_session_version_ck CHECK (session_version >= 1)
  );

  CREATE TABLE unit_memberships (
    user_id bigint NOT NULL CONSTRAINT unit_memberships_user_fk REFERENCES users,
    unit_id bigint NOT NULL CONSTRAINT unit_memberships_unit_fk REFERENCES units,
    ${wordColumn("unit_memberships", "role", ["therapist", "intensivist", "nurse"])} NOT NULL,
    lead boolean NOT NULL DEFAULT false,
    -- Serves: the memberships of the person who asks, on every request.
    CONSTRAINT unit_memberships_pk PRIMARY KEY (user_id, unit_id)
  );

  CREATE TABLE hospital_administrators (
    user_id bigint NOT NULL CONSTRAINT hospital_administrators_user_fk REFERENCES users,
    hospital_id bigint NOT NULL CONSTRAINT hospital_administrators_hospital_fk REFERENCES hospitals,
    -- Serves: what the person who asks administers, on every request.
    CONSTRAINT hospital_administrators_pk PRIMARY KEY (user_id, hospital_id)
  );

  CREATE TABLE sessions (
    id uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT sessions_pk PRIMARY KEY,
    user_id bigint NOT NULL CONSTRAINT sessions_user_fk REFERENCES users,
    session_version integer NOT NULL,
    created_at timestamptz(3) NOT NULL DEFAULT date_trunc('milliseconds', clock_timestamp()),
    last_action_at timestamptz(3) NOT NULL DEFAULT date_trunc('milliseconds', clock_timestamp()),
    ended_at timestamptz(3)
  );
  -- Serves: a person's open sessions, newest first.
  CREATE INDEX sessions_user_open_ix ON sessions (user_id, created_at DESC) WHERE ended_at IS NULL;

  CREATE TABLE sign_in_attempts (
    key varchar(255) CONSTRAINT sign_in_attempts_pk PRIMARY KEY,
    points integer NOT NULL DEFAULT 0,
    expire bigint
  );
  -- Serves: the limiter's removal of what has expired.
  CREATE INDEX sign_in_attempts_expire_ix ON sign_in_attempts (expire);`;

const policies = `
  CREATE TABLE unit_policies (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT unit_policies_pk PRIMARY KEY,
    unit_id bigint NOT NULL CONSTRAINT unit_policies_unit_fk REFERENCES units,
    recorded_at timestamptz(3) NOT NULL,
    -- None where the unit's first policy came with its set-up.
    author_id bigint CONSTRAINT unit_policies_author_fk REFERENCES users,
    time_zone text NOT NULL CONSTRAINT unit_policies_time_zone_ck CHECK (length(time_zone) BETWEEN 1 AND 64),
    -- From sea level under high pressure to the highest towns.
    barometric_pressure_mm_hg numeric NOT NULL
      CONSTRAINT unit_policies_barometric_pressure_mm_hg_ck CHECK (barometric_pressure_mm_hg BETWEEN 400 AND 800),
    ${wordColumn("unit_policies", "gas_unit", ["mmHg", "kPa"])} NOT NULL,
    nurses_set_ventilators boolean NOT NULL DEFAULT false,
    intervals jsonb NOT NULL DEFAULT '{}' CONSTRAINT unit_policies_intervals_ck CHECK (jsonb_typeof(intervals) = 'object'),
    margins jsonb NOT NULL DEFAULT '{}' CONSTRAINT unit_policies_margins_ck CHECK (jsonb_typeof(margins) = 'object'),
    steps jsonb NOT NULL DEFAULT '{}' CONSTRAINT unit_policies_steps_ck CHECK (jsonb_typeof(steps) = 'object'),
    default_targets jsonb NOT NULL CONSTRAINT unit_policies_default_targets_ck CHECK (jsonb_typeof(default_targets) = 'object'),
    shifts jsonb NOT NULL DEFAULT '[]' CONSTRAINT unit_policies_shifts_ck CHECK (jsonb_typeof(shifts) = 'array'),
    next_steps_enabled_by bigint CONSTRAINT unit_policies_next_steps_enabled_by_fk REFERENCES users,
    next_steps_enabled_at timestamptz(3),
    CONSTRAINT unit_policies_next_steps_ck CHECK ((next_steps_enabled_by IS NULL) = (next_steps_enabled_at IS NULL))
  );
  -- Serves: the policy of a unit in force at a moment.
  CREATE INDEX unit_policies_in_force_ix ON unit_policies (unit_id, recorded_at DESC, id DESC);
  ${appendOnly("unit_policies")}
  ${recordedByServerClock("unit_policies")}`;

export const unitsAndPeople: SchemaMigration = {
  name: "0002-units-and-people",
  sql: places + people + policies,
};
