import type { SchemaMigration } from "./migration";
import { appendOnly, numericColumn, recordedByServerClock, wordColumn } from "./sql";

const kinds = [
  "settings",
  "settings-checks",
  "mechanics",
  "observations",
  "heights",
  "targets",
  "acknowledgements",
] as const;
type Kind = (typeof kinds)[number];

const entries = `
  CREATE TABLE chart_entries (
    id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT chart_entries_pk PRIMARY KEY,
    submission_id bigint NOT NULL CONSTRAINT chart_entries_submission_fk REFERENCES submissions,
    episode_id bigint NOT NULL CONSTRAINT chart_entries_episode_fk REFERENCES ventilation_episodes,
    ${wordColumn("chart_entries", "kind", kinds)} NOT NULL,
    charted_at timestamptz(3) NOT NULL,
    -- What the bedside clock stood off UTC: the charted wall time can be told again.
    charted_offset_min smallint NOT NULL
      CONSTRAINT chart_entries_charted_offset_min_ck CHECK (charted_offset_min BETWEEN -840 AND 840),
    recorded_at timestamptz(3) NOT NULL,
    author_id bigint NOT NULL CONSTRAINT chart_entries_author_fk REFERENCES users,
    supersedes_id bigint CONSTRAINT chart_entries_supersedes_uq UNIQUE,
    ${wordColumn("chart_entries", "correction", ["replace", "void"])},
    -- Why it was corrected or voided; why something was charted stands with the detail.
    reason text CONSTRAINT chart_entries_reason_ck CHECK (length(reason) BETWEEN 1 AND 200),
    ${wordColumn("chart_entries", "source", ["person", "file", "device"])} NOT NULL DEFAULT 'person',
    CONSTRAINT chart_entries_submission_kind_uq UNIQUE (submission_id, episode_id, kind),
    CONSTRAINT chart_entries_id_episode_kind_uq UNIQUE (id, episode_id, kind),
    CONSTRAINT chart_entries_id_kind_uq UNIQUE (id, kind),
    CONSTRAINT chart_entries_supersedes_fk FOREIGN KEY (supersedes_id, episode_id, kind)
      REFERENCES chart_entries (id, episode_id, kind),
    CONSTRAINT chart_entries_correction_supersedes_ck CHECK ((supersedes_id IS NULL) = (correction IS NULL)),
    CONSTRAINT chart_entries_correction_reason_ck CHECK (correction IS NULL OR reason IS NOT NULL),
    CONSTRAINT chart_entries_not_itself_ck CHECK (supersedes_id <> id)
  );
  -- Serves: facts of an episode by kind, newest first (worksheet, Beds, history).
  CREATE INDEX chart_entries_newest_ix ON chart_entries (episode_id, kind, charted_at DESC, recorded_at DESC, id DESC);
  ${appendOnly("chart_entries")}
  ${recordedByServerClock("chart_entries")}

  CREATE FUNCTION refuse_after_void() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF EXISTS (SELECT FROM chart_entries WHERE id = NEW.supersedes_id AND correction = 'void') THEN
      RAISE EXCEPTION 'A void is final: entry % cannot be superseded', NEW.supersedes_id
        USING ERRCODE = 'check_violation', TABLE = TG_TABLE_NAME, CONSTRAINT = 'chart_entries_void_is_final';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER refuse_after_void BEFORE INSERT ON chart_entries
    FOR EACH ROW WHEN (NEW.supersedes_id IS NOT NULL) EXECUTE FUNCTION refuse_after_void();
  ALTER TABLE chart_entries ENABLE ALWAYS TRIGGER refuse_after_void;

  CREATE FUNCTION refuse_detail_of_void() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF EXISTS (SELECT FROM chart_entries WHERE id = NEW.entry_id AND correction = 'void') THEN
      RAISE EXCEPTION 'A void has no content: entry % takes no row of %', NEW.entry_id, TG_TABLE_NAME
        USING ERRCODE = 'check_violation', TABLE = TG_TABLE_NAME, CONSTRAINT = 'void_has_no_detail';
    END IF;
    RETURN NEW;
  END $$;`;

/** A kind's own table: keyed by its entry, and only by an entry of that kind. */
function detailTable(table: string, kind: Kind, columns: readonly string[]): string {
  const body = [
    `entry_id bigint NOT NULL CONSTRAINT ${table}_pk PRIMARY KEY`,
    `kind text NOT NULL DEFAULT '${kind}' CONSTRAINT ${table}_kind_ck CHECK (kind = '${kind}')`,
    ...columns,
    `CONSTRAINT ${table}_entry_fk FOREIGN KEY (entry_id, kind) REFERENCES chart_entries (id, kind)`,
  ];
  return `
  CREATE TABLE ${table} (
    ${body.join(",\n    ")}
  );
  ${appendOnly(table)}
  CREATE TRIGGER refuse_detail_of_void BEFORE INSERT ON ${table}
    FOR EACH ROW EXECUTE FUNCTION refuse_detail_of_void();
  ALTER TABLE ${table} ENABLE ALWAYS TRIGGER refuse_detail_of_void;`;
}

const reasonColumn = (table: string) =>
  `reason text CONSTRAINT ${table}_reason_ck CHECK (length(reason) BETWEEN 1 AND 200)`;

const modes = [
  "A/C-VC",
  "A/C-PC",
  "A/C-vtPC",
  "SIMV-VC-PS",
  "SIMV-PC-PS",
  "CSV-PS",
  "CPAP",
  "APRV",
  "HFOV",
  "NIV",
  "HFNO",
];

const settingNumbers = [
  ["tidal_volume_ml", [20, 2000]],
  ["pressure_above_peep_cm_h2o", [1, 80]],
  ["pressure_support_cm_h2o", [0, 60]],
  ["respiratory_rate", [1, 120]],
  ["peep_cm_h2o", [0, 50]],
  ["inspiratory_time_s", [0.1, 10]],
  // Conventional flow is 5 to 200, high flow 1 to 80: the union here, the use case refuses by mode.
  ["flow_l_per_min", [1, 200]],
  ["trigger_l_per_min", [0.1, 20]],
  ["trigger_cm_h2o", [0.1, 20]],
  ["p_high_cm_h2o", [5, 60]],
  ["p_low_cm_h2o", [0, 40]],
  ["t_high_s", [0.2, 30]],
  ["t_low_s", [0.1, 5]],
  ["mean_airway_pressure_cm_h2o", [0, 80]],
  ["frequency_hz", [3, 20]],
  ["amplitude_cm_h2o", [5, 150]],
] as const;

const settings = detailTable("setting_changes", "settings", [
  wordColumn("setting_changes", "mode", modes),
  ...settingNumbers.map(([column, range]) => numericColumn("setting_changes", column, range)),
  // A fraction has no exact binary form: whole percent compares and stores exactly.
  "fio2_percent integer CONSTRAINT setting_changes_fio2_percent_ck CHECK (fio2_percent BETWEEN 21 AND 100)",
  wordColumn("setting_changes", "flow_pattern", ["square", "decelerating"]),
  wordColumn("setting_changes", "trigger_type", ["flow", "pressure"]),
  reasonColumn("setting_changes"),
  `CONSTRAINT setting_changes_something_ck CHECK (num_nonnulls(mode, fio2_percent, flow_pattern, trigger_type, ${settingNumbers.map(([column]) => column).join(", ")}) > 0)`,
]);

const mechanicsNumbers = [
  ["respiratory_rate_total", [0, 150]],
  ["minute_volume_l_per_min", [0, 60]],
  ["peak_cm_h2o", [2, 120]],
  ["plateau_cm_h2o", [2, 100]],
  ["total_peep_cm_h2o", [0, 60]],
  ["mean_airway_pressure_cm_h2o", [0, 80]],
  ["pes_end_inspiratory_cm_h2o", [-40, 60]],
  ["pes_end_expiratory_cm_h2o", [-40, 60]],
] as const;

const mechanics = detailTable("mechanics_readings", "mechanics", [
  numericColumn("mechanics_readings", "exhaled_tidal_volume_ml", [10, 2000], { zeroAllowed: true }),
  numericColumn("mechanics_readings", "spontaneous_tidal_volume_ml", [10, 2000], { zeroAllowed: true }),
  ...mechanicsNumbers.map(([column, range]) => numericColumn("mechanics_readings", column, range)),
  wordColumn("mechanics_readings", "hold", ["relaxed", "effort", "unsure", "not-possible"]),
  "hold_reason text CONSTRAINT mechanics_readings_hold_reason_ck CHECK (length(hold_reason) BETWEEN 1 AND 200)",
  "end_inspiratory_flow_zero boolean",
  "breath_stacking boolean",
  "CONSTRAINT mechanics_readings_plateau_peak_ck CHECK (plateau_cm_h2o - peak_cm_h2o <= 2)",
  "CONSTRAINT mechanics_readings_plateau_total_peep_ck CHECK (plateau_cm_h2o > total_peep_cm_h2o)",
  "CONSTRAINT mechanics_readings_hold_not_possible_ck CHECK (hold IS DISTINCT FROM 'not-possible' OR (plateau_cm_h2o IS NULL AND hold_reason IS NOT NULL))",
  `CONSTRAINT mechanics_readings_something_ck CHECK (num_nonnulls(exhaled_tidal_volume_ml, spontaneous_tidal_volume_ml, hold, hold_reason, end_inspiratory_flow_zero, breath_stacking, ${mechanicsNumbers.map(([column]) => column).join(", ")}) > 0)`,
]);

const observationNumbers = [
  ["spo2_percent", [30, 100]],
  ["etco2_mm_hg", [0, 150]],
  ["respiratory_rate_total", [0, 150]],
  ["heart_rate", [0, 300]],
  ["systolic_mm_hg", [0, 350]],
  ["map_mm_hg", [0, 250]],
] as const;

const observations = detailTable("observations", "observations", [
  ...observationNumbers.map(([column, range]) => numericColumn("observations", column, range)),
  `CONSTRAINT observations_something_ck CHECK (num_nonnulls(${observationNumbers.map(([column]) => column).join(", ")}) > 0)`,
]);

// The length that was measured; height_cm beside it is what was worked out from it when it was charted.
const heights = detailTable("heights", "heights", [
  `${wordColumn("heights", "method", ["measured-standing", "measured-lying", "document", "ulna", "knee-height", "demispan", "reported"])} NOT NULL`,
  `${wordColumn("heights", "sex_for_pbw", ["male", "female"])} NOT NULL`,
  `${numericColumn("heights", "height_cm", [100, 250])} NOT NULL`,
  numericColumn("heights", "ulna_cm", [18.5, 32]),
  numericColumn("heights", "demispan_cm", [50, 120]),
  numericColumn("heights", "knee_height_cm", [30, 75]),
  reasonColumn("heights"),
  `CONSTRAINT heights_length_of_method_ck CHECK (
      (method = 'ulna') = (ulna_cm IS NOT NULL)
      AND (method = 'demispan') = (demispan_cm IS NOT NULL)
      AND (method = 'knee-height') = (knee_height_cm IS NOT NULL))`,
]);

const derivedNames = [
  "vtMlPerKg",
  "plateauCmH2O",
  "drivingPressureCmH2O",
  "intrinsicPeepCmH2O",
  "mechanicalPowerJPerMin",
  "respiratoryRateTotal",
  "spo2Percent",
  "pao2MmHg",
  "paco2MmHg",
  "ph",
];

const judgements =
  detailTable("settings_checks", "settings-checks", []) +
  detailTable("target_orders", "targets", [
    "targets jsonb NOT NULL CONSTRAINT target_orders_targets_ck CHECK (jsonb_typeof(targets) = 'object')",
    reasonColumn("target_orders"),
  ]) +
  detailTable("acknowledgements", "acknowledgements", [
    `${wordColumn("acknowledgements", "metric", derivedNames)} NOT NULL`,
    // The value that was answered: none where the finding was an unmeasured one.
    "value numeric",
    "until timestamptz(3) NOT NULL",
    "note text NOT NULL CONSTRAINT acknowledgements_note_ck CHECK (length(note) BETWEEN 1 AND 200)",
  ]);

export const chart: SchemaMigration = {
  name: "0004-chart",
  sql: entries + settings + mechanics + observations + heights + judgements,
};
