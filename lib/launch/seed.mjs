import { startCluster } from "./cluster.mjs";
import { endLeftBehind, takeDataFolder } from "./data-lock.mjs";
import { newDemoDatabase } from "./demo.mjs";
import { ensureInstalled } from "./install.mjs";
import { atEnd, launch } from "./lifetime.mjs";
import { Refusal } from "./refusal.mjs";
import { loadEnvFile, readSettings, root } from "./settings.mjs";

/** `npm run seed`: the demo's database from nothing, while no server uses it. */
await launch(async () => {
  loadEnvFile();
  const settings = readSettings();
  if (settings.mode === "production")
    throw new Refusal("npm run seed makes invented people; in production it does nothing.");
  const data = await takeDataFolder(settings.data, "npm run seed");
  atEnd(() => endLeftBehind(data));
  await ensureInstalled(root, data);
  const cluster = await startCluster({ ...settings, data });
  await newDemoDatabase(cluster, { data, url: `http://127.0.0.1:${settings.port}` });
  console.log("The demo data is new.");
  return 0;
});
