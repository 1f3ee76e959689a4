/** Pieces of DDL that migrations share. They state constraints by name; a migration that has run is never edited. */

/** A NUMERIC without scale (REAL would lose 30.05; a scale would round it silently), held to its refuse range. */
export function numericColumn(
  table: string,
  column: string,
  [min, max]: readonly [number, number],
  { zeroAllowed = false } = {},
): string {
  const range = `${column} BETWEEN ${min} AND ${max}`;
  const check = zeroAllowed ? `${column} = 0 OR ${range}` : range;
  return `${column} numeric CONSTRAINT ${table}_${column}_ck CHECK (${check})`;
}

/** A text column held to a list of words. */
export function wordColumn(table: string, column: string, words: readonly string[]): string {
  const list = words.map((word) => `'${word}'`).join(", ");
  return `${column} text CONSTRAINT ${table}_${column}_ck CHECK (${column} IN (${list}))`;
}

/** Refuses UPDATE, DELETE and TRUNCATE of a table, for its owner too, and under any session_replication_role. */
export function appendOnly(table: string): string {
  return `
    CREATE TRIGGER refuse_change BEFORE UPDATE OR DELETE OR TRUNCATE ON ${table}
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
    ALTER TABLE ${table} ENABLE ALWAYS TRIGGER refuse_change;`;
}

/** Takes `recorded_at` from the server's clock for every role but the table's owner. */
export function recordedByServerClock(table: string): string {
  return `
    CREATE TRIGGER set_recorded_at BEFORE INSERT ON ${table}
      FOR EACH ROW EXECUTE FUNCTION set_recorded_at();
    ALTER TABLE ${table} ENABLE ALWAYS TRIGGER set_recorded_at;`;
}
