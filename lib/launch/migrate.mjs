import { startCluster } from "./cluster.mjs";
import { endLeftBehind, takeDataFolder } from "./data-lock.mjs";
import { APP_ROLE, ensureDatabase } from "./database.mjs";
import { ensureInstalled } from "./install.mjs";
import { atEnd, launch } from "./lifetime.mjs";
import { migrate } from "./migrations.mjs";
import { productionMigration } from "./production.mjs";
import { loadEnvFile, readSettings, root } from "./settings.mjs";

async function migrateDemo(settings) {
  const data = await takeDataFolder(settings.data, "npm run db:migrate");
  atEnd(() => endLeftBehind(data));
  await ensureInstalled(root, data);
  const cluster = await startCluster({ ...settings, data });
  const urls = await ensureDatabase(cluster, { data });
  await migrate({ data, ownerUrl: urls.owner, appRole: APP_ROLE });
}

// Servers may go on meanwhile: migrations only go forward, and one advisory lock keeps two runs apart.
async function migrateProduction() {
  const addresses = productionMigration(process.env);
  await ensureInstalled(root);
  await migrate(addresses);
}

/** `npm run db:migrate`: the schema alone. In production the only command that takes the owner's address. */
await launch(async () => {
  loadEnvFile();
  const settings = readSettings();
  await (settings.mode === "production" ? migrateProduction() : migrateDemo(settings));
  return 0;
});
