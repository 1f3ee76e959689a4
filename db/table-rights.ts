/**
 * What the application's role may do beside SELECT and INSERT. A table that is not named here is append-only: a new one
 * is so until somebody names it. `true` is every column.
 */
export const updatable: Readonly<Record<string, true | readonly string[]>> = {
  hospitals: true,
  units: true,
  beds: true,
  bed_stays: true,
  patients: true,
  ventilation_episodes: true,
  episode_pauses: true,
  users: ["session_version"],
  sessions: ["last_action_at", "ended_at"],
  unit_memberships: ["role", "lead"],
  hospital_administrators: true,
  sign_in_attempts: true,
};

export const deletable: readonly string[] = ["sign_in_attempts"];

/** Kept by the migrations alone; the application reads it to know whether one is pending. */
export const migrationsTable = "schema_migrations";

/** Tables of schema public that stand outside the append-only rule. */
export const mutableTables: readonly string[] = Object.keys(updatable);
