import type { SchemaMigration } from "./migration";
import { appendOnly, recordedByServerClock } from "./sql";

export const audit: SchemaMigration = {
  name: "0005-audit",
  sql: `
  CREATE TABLE audit_events (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT audit_events_pk PRIMARY KEY,
    recorded_at timestamptz(3) NOT NULL,
    -- In UTC; part of the unique key, so that the table may be partitioned by month.
    month date GENERATED ALWAYS AS (date_trunc('month', recorded_at AT TIME ZONE 'UTC')::date) STORED,
    -- None where nobody was signed in, as when a sign-in fails.
    actor_id bigint CONSTRAINT audit_events_actor_fk REFERENCES users,
    action text NOT NULL CONSTRAINT audit_events_action_ck CHECK (length(action) BETWEEN 1 AND 60),
    hospital_id bigint CONSTRAINT audit_events_hospital_fk REFERENCES hospitals,
    unit_id bigint CONSTRAINT audit_events_unit_fk REFERENCES units,
    patient_id bigint CONSTRAINT audit_events_patient_fk REFERENCES patients,
    submission_id bigint CONSTRAINT audit_events_submission_fk REFERENCES submissions,
    -- What was changed, where it is neither patient nor submission: a table's name and the row's key.
    subject text CONSTRAINT audit_events_subject_ck CHECK (length(subject) BETWEEN 1 AND 60),
    subject_id text CONSTRAINT audit_events_subject_id_ck CHECK (length(subject_id) BETWEEN 1 AND 120),
    old_values jsonb CONSTRAINT audit_events_old_values_ck CHECK (jsonb_typeof(old_values) = 'object'),
    new_values jsonb CONSTRAINT audit_events_new_values_ck CHECK (jsonb_typeof(new_values) = 'object'),
    request_id text CONSTRAINT audit_events_request_id_ck CHECK (length(request_id) BETWEEN 1 AND 100),
    -- One row for the reads of a person and patient in 15 minutes; none on other events.
    dedupe_key text CONSTRAINT audit_events_dedupe_key_ck CHECK (length(dedupe_key) BETWEEN 1 AND 200),
    CONSTRAINT audit_events_dedupe_uq UNIQUE (dedupe_key, month)
  );
  -- Serves: who looked at or changed a patient's record, newest first.
  CREATE INDEX audit_events_patient_ix ON audit_events (patient_id, recorded_at DESC) WHERE patient_id IS NOT NULL;
  -- Serves: what a person did, newest first.
  CREATE INDEX audit_events_actor_ix ON audit_events (actor_id, recorded_at DESC);
  ${appendOnly("audit_events")}
  ${recordedByServerClock("audit_events")}`,
};
