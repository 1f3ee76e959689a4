import { startCluster } from "./cluster.mjs";
import { endLeftBehind, takeDataFolder } from "./data-lock.mjs";
import { demoDatabase } from "./demo.mjs";
import { ensureInstalled } from "./install.mjs";
import { atEnd } from "./lifetime.mjs";
import { reservePort } from "./ports.mjs";
import { productionValues } from "./production.mjs";
import { secret } from "./secrets.mjs";
import { root } from "./settings.mjs";

/** What the server of a demo or a test gets. */
export async function localValues(mode, { data, url, databaseUrl }) {
  return {
    NEAPTIDE_MODE: mode,
    DATABASE_URL: databaseUrl,
    NEXTAUTH_SECRET: await secret(data, "nextauth"),
    NEXTAUTH_URL: url,
  };
}

async function demoValues(settings) {
  const cluster = await startCluster(settings);
  const urls = await demoDatabase(cluster, settings);
  void cluster.server.ended.then(() => settings.onDatabaseLost());
  return localValues("demo", { ...settings, databaseUrl: urls.app });
}

/**
 * All that comes before Next: the data folder, the port, the packages, and in the demo its database. Answers the
 * server's values, and `releasePort`, to be called just before Next takes the port.
 */
export async function prepare(settings, { name, onDatabaseLost }) {
  const url = `http://127.0.0.1:${settings.port}`;
  const production = settings.mode === "production" ? productionValues(process.env) : undefined;
  const data = await takeDataFolder(settings.data, `${name} at ${url}`);
  atEnd(() => endLeftBehind(data));
  const releasePort = await reservePort(settings.port, "PORT");
  await ensureInstalled(root, data);
  const values = production ?? (await demoValues({ ...settings, data, url, onDatabaseLost }));
  return { data, url, values, releasePort };
}
