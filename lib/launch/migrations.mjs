import { childEnvironment } from "./child-environment.mjs";
import { run } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";
import { root } from "./settings.mjs";

/** Brings the database at the owner's address to this checkout's schema, and grants to the application's role. */
export async function migrate({ data, ownerUrl, appRole }) {
  const env = childEnvironment(data, { MIGRATION_DATABASE_URL: ownerUrl, APP_DATABASE_ROLE: appRole });
  const code = await run(process.execPath, ["--import", "tsx", "db/migrate.ts"], { cwd: root, env });
  if (code !== 0) throw new Refusal("The database was not migrated; the reason stands above.");
}
