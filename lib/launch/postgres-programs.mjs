import { existsSync, readdirSync } from "node:fs";
import { mkdir, readFile, rm, writeFile } from "node:fs/promises";
import { delimiter, dirname, join } from "node:path";
import { installPackage } from "./debian-packages.mjs";
import { Refusal } from "./refusal.mjs";

const DEBIAN_VERSIONS = "/usr/lib/postgresql";
const OLDEST_VERSION = 15;
const PROGRAMS = ["postgres", "initdb", "psql"];

const isComplete = (folder) => PROGRAMS.every((program) => existsSync(join(folder, program)));

function debianFolders() {
  if (!existsSync(DEBIAN_VERSIONS)) return [];
  return readdirSync(DEBIAN_VERSIONS)
    .filter((version) => Number(version) >= OLDEST_VERSION)
    .sort((a, b) => Number(b) - Number(a))
    .map((version) => join(DEBIAN_VERSIONS, version, "bin"));
}

function installedFolders() {
  return [...debianFolders(), ...(process.env.PATH ?? "").split(delimiter)].filter(isComplete);
}

/** Debian's package would start a cluster of its own; this checkout needs only the programs. */
async function installPostgres() {
  const rule = "/etc/postgresql-common/createcluster.d/neaptide.conf";
  const asRoot = process.getuid() === 0;
  if (asRoot) {
    await mkdir(dirname(rule), { recursive: true });
    await writeFile(rule, "create_main_cluster = false\n");
  }
  try {
    await installPackage("postgresql", "PostgreSQL");
  } finally {
    if (asRoot) await rm(rule, { force: true });
  }
}

async function clusterVersion(clusterFolder) {
  const path = join(clusterFolder, "PG_VERSION");
  return existsSync(path) ? (await readFile(path, "utf8")).trim() : undefined;
}

/** The folder of PostgreSQL's programs, of the version that made the cluster when there is one. */
export async function postgresPrograms(clusterFolder) {
  if (installedFolders().length === 0) await installPostgres();
  const folders = installedFolders();
  const version = await clusterVersion(clusterFolder);
  const made = version && folders.find((folder) => folder === join(DEBIAN_VERSIONS, version, "bin"));
  const chosen = made || folders[0];
  if (!chosen) throw new Refusal(`PostgreSQL ${OLDEST_VERSION} or newer is missing after the installation.`);
  return chosen;
}
