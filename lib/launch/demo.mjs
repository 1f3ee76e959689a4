import { existsSync } from "node:fs";
import { rm, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { childEnvironment } from "./child-environment.mjs";
import { APP_ROLE, DATABASE, dropDatabase, ensureDatabase } from "./database.mjs";
import { migrate } from "./migrations.mjs";
import { run } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";
import { secret } from "./secrets.mjs";
import { root } from "./settings.mjs";
import { runSql } from "./sql.mjs";

const unfinished = (data) => join(data, "seeding");

async function hasPeople(cluster) {
  return (await runSql(cluster, "SELECT EXISTS (SELECT FROM users);", { database: DATABASE })) === "t";
}

/** Only this process works as the owner: the demo's story needs times in the past, which other roles cannot write. */
async function seed({ data, ownerUrl, url }) {
  const env = childEnvironment(data, {
    NEAPTIDE_MODE: "demo",
    DATABASE_URL: ownerUrl,
    NEXTAUTH_SECRET: await secret(data, "nextauth"),
    NEXTAUTH_URL: url,
  });
  const code = await run(process.execPath, ["--import", "tsx", "seeds/run.ts"], { cwd: root, env });
  if (code !== 0) throw new Refusal("The demo data was not made; the reason stands above.");
}

async function migratedDatabase(cluster, settings) {
  const urls = await ensureDatabase(cluster, settings);
  await migrate({ data: settings.data, ownerUrl: urls.owner, appRole: APP_ROLE });
  return urls;
}

/** The migrated database with the demo's people; what an interrupted seeding left is made anew. */
export async function demoDatabase(cluster, settings) {
  const { data, url } = settings;
  if (existsSync(unfinished(data))) await dropDatabase(cluster);
  const urls = await migratedDatabase(cluster, settings);
  if (await hasPeople(cluster)) return urls;
  await writeFile(unfinished(data), "");
  await seed({ data, ownerUrl: urls.owner, url });
  await rm(unfinished(data));
  return urls;
}

/** The demo's database from nothing. */
export async function newDemoDatabase(cluster, settings) {
  await dropDatabase(cluster);
  return demoDatabase(cluster, settings);
}
