/** One step of the schema: plain SQL, run in a transaction of its own. */
export interface SchemaMigration {
  name: string;
  sql: string;
}
