import { startCluster } from "./cluster.mjs";
import { takeDataFolder, endLeftBehind } from "./data-lock.mjs";
import { APP_ROLE, ensureDatabase } from "./database.mjs";
import { ensureInstalled } from "./install.mjs";
import { atEnd, launch } from "./lifetime.mjs";
import { migrate } from "./migrations.mjs";
import { Refusal } from "./refusal.mjs";
import { loadEnvFile, readSettings, root } from "./settings.mjs";

/** `npm run db`: the database alone, for work on single tests; it stays until Ctrl-C. */
await launch(async ({ serving }) => {
  loadEnvFile();
  const settings = readSettings();
  if (settings.mode === "production")
    throw new Refusal("npm run db is for work on the demo; NEAPTIDE_MODE is 'production'.");
  const data = await takeDataFolder(settings.data, "npm run db");
  atEnd(() => endLeftBehind(data));
  await ensureInstalled(root, data);
  const cluster = await startCluster({ data, pgPort: settings.pgPort });
  const urls = await ensureDatabase(cluster, { data, mayCreateDatabases: true });
  console.log(`export TEST_DATABASE_ADMIN_URL=${urls.owner}\nexport TEST_DATABASE_APP_URL=${urls.app}`);
  serving();
  // Whoever works on a migration needs the database most when that migration fails.
  await migrate({ data, ownerUrl: urls.owner, appRole: APP_ROLE }).catch((error) => console.error(error.message));
  await cluster.server.ended;
  throw new Refusal("PostgreSQL ended by itself; postgres.log in the data folder says why.");
});
