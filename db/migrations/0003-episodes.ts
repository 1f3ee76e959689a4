import type { SchemaMigration } from "./migration";
import { appendOnly, numericColumn, recordedByServerClock, wordColumn } from "./sql";

const submissions = `
  -- Every POST with a client key inserts here first; no row back from ON CONFLICT DO NOTHING is a repeat.
  CREATE TABLE submissions (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT submissions_pk PRIMARY KEY,
    author_id bigint NOT NULL CONSTRAINT submissions_author_fk REFERENCES users,
    client_key uuid NOT NULL,
    -- SHA-256 of method, path and body, in lower-case hexadecimal.
    body_hash text NOT NULL CONSTRAINT submissions_body_hash_ck CHECK (body_hash ~ '^[0-9a-f]{64}$'),
    recorded_at timestamptz(3) NOT NULL,
    CONSTRAINT submissions_author_client_key_uq UNIQUE (author_id, client_key)
  );
  ${appendOnly("submissions")}
  ${recordedByServerClock("submissions")}`;

const patients = `
  CREATE TABLE patients (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT patients_pk PRIMARY KEY,
    hospital_id bigint NOT NULL CONSTRAINT patients_hospital_fk REFERENCES hospitals,
    mrn text NOT NULL CONSTRAINT patients_mrn_ck CHECK (mrn = btrim(mrn) AND length(mrn) BETWEEN 1 AND 32),
    name text NOT NULL CONSTRAINT patients_name_ck CHECK (name = btrim(name) AND length(name) BETWEEN 1 AND 200),
    birth_date date NOT NULL CONSTRAINT patients_birth_date_ck CHECK (birth_date >= DATE '1880-01-01'),
    CONSTRAINT patients_hospital_mrn_uq UNIQUE (hospital_id, mrn)
  );`;

const episodes = `
  CREATE TABLE ventilation_episodes (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT ventilation_episodes_pk PRIMARY KEY,
    patient_id bigint NOT NULL CONSTRAINT ventilation_episodes_patient_fk REFERENCES patients,
    unit_id bigint NOT NULL CONSTRAINT ventilation_episodes_unit_fk REFERENCES units,
    -- The admission's submission: how its repeat finds the episode.
    submission_id bigint NOT NULL
      CONSTRAINT ventilation_episodes_submission_fk REFERENCES submissions
      CONSTRAINT ventilation_episodes_submission_uq UNIQUE,
    intubated_at timestamptz(3) NOT NULL,
    ended_at timestamptz(3),
    ${wordColumn("ventilation_episodes", "end_reason", ["liberation", "tracheostomy-collar", "death", "transfer"])},
    reason_for_ventilation text
      CONSTRAINT ventilation_episodes_reason_ck CHECK (length(reason_for_ventilation) BETWEEN 1 AND 200),
    ards_risk_factor text
      CONSTRAINT ventilation_episodes_ards_risk_factor_ck CHECK (length(ards_risk_factor) BETWEEN 1 AND 200),
    ${numericColumn("ventilation_episodes", "tube_size_mm", [2, 12])},
    ${numericColumn("ventilation_episodes", "tube_depth_cm", [5, 40])},
    CONSTRAINT ventilation_episodes_end_ck CHECK ((ended_at IS NULL) = (end_reason IS NULL)),
    CONSTRAINT ventilation_episodes_order_ck CHECK (ended_at >= intubated_at)
  );
  -- One open episode per patient.
  CREATE UNIQUE INDEX ventilation_episodes_open_patient_uq ON ventilation_episodes (patient_id) WHERE ended_at IS NULL;
  -- Serves: the newest episode of a patient, open or ended.
  CREATE INDEX ventilation_episodes_patient_ix ON ventilation_episodes (patient_id, intubated_at DESC, id DESC);
  -- Serves: the open episodes of a unit (Beds).
  CREATE INDEX ventilation_episodes_open_unit_ix ON ventilation_episodes (unit_id) WHERE ended_at IS NULL;

  CREATE TABLE episode_pauses (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT episode_pauses_pk PRIMARY KEY,
    episode_id bigint NOT NULL CONSTRAINT episode_pauses_episode_fk REFERENCES ventilation_episodes,
    paused_at timestamptz(3) NOT NULL,
    resumed_at timestamptz(3),
    CONSTRAINT episode_pauses_order_ck CHECK (resumed_at > paused_at),
    -- Also serves: the pauses of an episode.
    CONSTRAINT episode_pauses_no_overlap_ex EXCLUDE USING gist (episode_id WITH =, tstzrange(paused_at, resumed_at) WITH &&)
  );`;

const bedStays = `
  -- Checked at the end of the transaction, so that two patients can swap beds.
  CREATE TABLE bed_stays (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT bed_stays_pk PRIMARY KEY,
    episode_id bigint NOT NULL CONSTRAINT bed_stays_episode_fk REFERENCES ventilation_episodes,
    bed_id bigint NOT NULL CONSTRAINT bed_stays_bed_fk REFERENCES beds,
    during tstzrange NOT NULL CONSTRAINT bed_stays_during_ck CHECK (NOT isempty(during)),
    CONSTRAINT bed_stays_one_patient_a_bed_ex EXCLUDE USING gist (bed_id WITH =, during WITH &&)
      DEFERRABLE INITIALLY DEFERRED,
    CONSTRAINT bed_stays_one_bed_a_patient_ex EXCLUDE USING gist (episode_id WITH =, during WITH &&)
      DEFERRABLE INITIALLY DEFERRED
  );`;

export const episodesAndBedStays: SchemaMigration = {
  name: "0003-episodes",
  sql: submissions + patients + episodes + bedStays,
};
