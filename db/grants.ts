import type { Client } from "pg";
import { deletable, migrationsTable, updatable } from "./table-rights";

const quoted = (name: string) => `"${name.replaceAll('"', '""')}"`;

async function roleExists(client: Client, role: string): Promise<boolean> {
  const { rowCount } = await client.query("SELECT FROM pg_roles WHERE rolname = $1", [role]);
  return rowCount === 1;
}

/** Whoever sets the database up makes the application's role; a migration makes it only where it is allowed to. */
async function ensureRole(client: Client, role: string): Promise<void> {
  if (await roleExists(client, role)) return;
  const { rows } = await client.query<{ may: boolean }>(
    "SELECT rolcreaterole OR rolsuper AS may FROM pg_roles WHERE rolname = current_user",
  );
  if (!rows[0]?.may) {
    throw new Error(
      `The application's role ${role} does not exist, and the owner may not make it. As an administrator run: CREATE ROLE ${role} LOGIN PASSWORD '…'`,
    );
  }
  await client.query(`CREATE ROLE ${quoted(role)} LOGIN NOSUPERUSER NOCREATEDB NOCREATEROLE NOREPLICATION`);
}

function updateGrant(table: string, role: string): string {
  const columns = updatable[table];
  if (!columns) return "";
  const list = columns === true ? "" : ` (${columns.map(quoted).join(", ")})`;
  return `GRANT UPDATE${list} ON ${quoted(table)} TO ${role};`;
}

function tableGrants(table: string, role: string): string {
  if (table === migrationsTable) return `GRANT SELECT ON ${quoted(table)} TO ${role};`;
  const removal = deletable.includes(table) ? `GRANT DELETE ON ${quoted(table)} TO ${role};` : "";
  return `GRANT SELECT, INSERT ON ${quoted(table)} TO ${role};${updateGrant(table, role)}${removal}`;
}

/** Takes every right on the tables of schema public away from the application's role and gives what it needs. */
export async function grantToApplication(client: Client, roleName: string): Promise<void> {
  await ensureRole(client, roleName);
  const role = quoted(roleName);
  const { rows } = await client.query<{ name: string }>(
    "SELECT tablename AS name FROM pg_tables WHERE schemaname = 'public' ORDER BY 1",
  );
  const statements = [
    "REVOKE CREATE ON SCHEMA public FROM PUBLIC;",
    `REVOKE ALL ON ALL TABLES IN SCHEMA public FROM PUBLIC, ${role};`,
    `GRANT USAGE ON SCHEMA public TO ${role};`,
    ...rows.map(({ name }) => tableGrants(name, role)),
  ];
  await client.query(statements.join("\n"));
}
