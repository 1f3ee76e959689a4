import { join } from "node:path";
import { ensureBuilt } from "./build.mjs";
import { launch } from "./lifetime.mjs";
import { prepare } from "./prepare.mjs";
import { Refusal } from "./refusal.mjs";
import { loadEnvFile, readSettings, root } from "./settings.mjs";
import { serve } from "./web.mjs";

function whenLost() {
  let onDatabaseLost;
  const lost = new Promise((resolve) => (onDatabaseLost = resolve)).then(() => "PostgreSQL");
  return { lost, onDatabaseLost };
}

/** `npm start` and `npm run dev`: everything set up, then Next until the launcher is told to stop. */
export function runSite({ name, command, built }) {
  return launch(async ({ serving }) => {
    loadEnvFile();
    const settings = readSettings();
    const { lost, onDatabaseLost } = whenLost();
    const { data, url, values, releasePort } = await prepare(settings, { name, onDatabaseLost });
    if (built) await ensureBuilt(root, data);
    await releasePort();
    const log = join(data, "server.log");
    const server = await serve({ command, data, port: settings.port, url, values, log });
    serving();
    console.log(`Neaptide answers at ${url} (Ctrl-C stops it).`);
    const ended = await Promise.race([server.ended.then(() => "The server"), lost]);
    throw new Refusal(`${ended} ended by itself; its log is in ${data}.`);
  });
}
