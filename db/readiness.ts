import { QueryTypes } from "sequelize";
import { sequelize } from "./connection";
import { migrations } from "./migrations";
import { migrationsTable, mutableTables } from "./table-rights";

interface TableFacts {
  name: string;
  rights: string[];
  refuses: boolean;
  says_when: boolean;
  recorded_by_clock: boolean;
}

// 58 is pg_trigger's BEFORE (2) + DELETE (8) + UPDATE (16) + TRUNCATE (32), for each statement; 7 is ROW + BEFORE + INSERT.
const appendOnlyTablesSql = `
  SELECT c.relname AS name,
         array_remove(ARRAY[
           CASE WHEN has_table_privilege(c.oid, 'UPDATE') OR has_any_column_privilege(c.oid, 'UPDATE') THEN 'UPDATE' END,
           CASE WHEN has_table_privilege(c.oid, 'DELETE') THEN 'DELETE' END,
           CASE WHEN has_table_privilege(c.oid, 'TRUNCATE') THEN 'TRUNCATE' END,
           CASE WHEN has_table_privilege(c.oid, 'TRIGGER') THEN 'TRIGGER' END], NULL) AS rights,
         EXISTS (SELECT FROM pg_trigger t WHERE t.tgrelid = c.oid AND t.tgfoid = to_regproc('public.refuse_change')
                  AND t.tgtype = 58 AND t.tgenabled = 'A' AND t.tgqual IS NULL AND t.tgattr = '') AS refuses,
         EXISTS (SELECT FROM pg_attribute a
                  WHERE a.attrelid = c.oid AND a.attname = 'recorded_at' AND NOT a.attisdropped) AS says_when,
         EXISTS (SELECT FROM pg_trigger t WHERE t.tgrelid = c.oid AND t.tgfoid = to_regproc('public.set_recorded_at')
                  AND t.tgtype = 7 AND t.tgenabled = 'A' AND t.tgqual IS NULL) AS recorded_by_clock
    FROM pg_class c
   WHERE c.relnamespace = 'public'::regnamespace AND c.relkind IN ('r', 'p') AND c.relname NOT IN (:others)
   ORDER BY c.relname`;

const roleSql = `
  SELECT current_user AS name,
         (SELECT rolsuper FROM pg_roles WHERE rolname = current_user) AS superuser,
         EXISTS (SELECT FROM pg_class c
                  WHERE c.relnamespace = 'public'::regnamespace AND c.relkind IN ('r', 'p')
                    AND pg_has_role(current_user, c.relowner, 'MEMBER')) AS owner`;

function faultsOfTable(table: TableFacts): string[] {
  const { name, rights } = table;
  const faults = rights.length > 0 ? [`the application's role has ${rights.join(", ")} on ${name}`] : [];
  if (!table.refuses) faults.push(`the trigger that refuses changes of ${name} is missing or not enabled always`);
  if (table.says_when && !table.recorded_by_clock) {
    faults.push(`the trigger that sets recorded_at of ${name} is missing or not enabled always`);
  }
  return faults;
}

async function faultsOfTables(): Promise<string[]> {
  const tables = await sequelize.query<TableFacts>(appendOnlyTablesSql, {
    type: QueryTypes.SELECT,
    replacements: { others: [...mutableTables, migrationsTable] },
  });
  return tables.flatMap(faultsOfTable);
}

async function faultsOfRole(): Promise<string[]> {
  const [role] = await sequelize.query<{ name: string; superuser: boolean; owner: boolean }>(roleSql, {
    type: QueryTypes.SELECT,
  });
  if (!role) return ["the application's role is unknown"];
  return [
    ...(role.superuser ? [`the application's role ${role.name} is a superuser`] : []),
    ...(role.owner ? [`the application's role ${role.name} owns tables or belongs to their owner`] : []),
  ];
}

async function pendingMigrations(): Promise<string[]> {
  const [log] = await sequelize.query<{ exists: boolean }>("SELECT to_regclass(:table) IS NOT NULL AS exists", {
    type: QueryTypes.SELECT,
    replacements: { table: `public.${migrationsTable}` },
  });
  const ran = log?.exists
    ? await sequelize.query<{ name: string }>(`SELECT name FROM ${migrationsTable}`, { type: QueryTypes.SELECT })
    : [];
  const names = new Set(ran.map(({ name }) => name));
  return migrations.filter(({ name }) => !names.has(name)).map(({ name }) => `migration ${name} has not run`);
}

/**
 * What keeps this server from being ready: the record could be rewritten, a trigger that guards it is off, or the
 * schema is behind. Empty when ready. Runs as the application's role; throws when the database does not answer.
 */
export async function readinessFaults(): Promise<string[]> {
  return [...(await pendingMigrations()), ...(await faultsOfRole()), ...(await faultsOfTables())];
}
