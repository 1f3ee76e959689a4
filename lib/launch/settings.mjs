import { existsSync } from "node:fs";
import { mkdir, realpath } from "node:fs/promises";
import { dirname, isAbsolute, join } from "node:path";
import { fileURLToPath } from "node:url";
import { Refusal } from "./refusal.mjs";

export const root = join(dirname(fileURLToPath(import.meta.url)), "..", "..");

/** Whole number 1 to 65535, or undefined when unset. Throws Refusal on anything else. */
export function portFrom(name, text) {
  if (text === undefined || text === "") return undefined;
  const port = /^\d{1,5}$/.test(text) ? Number(text) : 0;
  if (port < 1 || port > 65535) throw new Refusal(`${name} must be a whole number from 1 to 65535, not '${text}'.`);
  return port;
}

/** The mode asked for; the demo is the default. */
export function modeFrom(environment) {
  const mode = environment.NEAPTIDE_MODE || "demo";
  if (mode !== "demo" && mode !== "production") {
    throw new Refusal(`NEAPTIDE_MODE is 'production', 'demo' or unset, not '${mode}'.`);
  }
  const given = ["DATABASE_URL", "MIGRATION_DATABASE_URL"].filter((name) => environment[name]);
  if (mode === "demo" && given.length > 0) {
    throw new Refusal(
      `${given.join(" and ")} is set, but NEAPTIDE_MODE is not 'production': the demo uses only its own database. Unset it, or set NEAPTIDE_MODE=production.`,
    );
  }
  return mode;
}

/** Adds `.env` to the environment; what is already set wins. */
export function loadEnvFile() {
  const path = join(root, ".env");
  if (existsSync(path) && process.loadEnvFile) process.loadEnvFile(path);
}

/** Makes a data folder that only its owner can enter, and says where it really is. */
export async function dataFolder(path) {
  await mkdir(path, { recursive: true, mode: 0o700 });
  return realpath(path);
}

/**
 * What the environment asks of the launcher.
 * @param {Record<string, string | undefined>} [environment]
 */
export function readSettings(environment = process.env) {
  const data = environment.NEAPTIDE_DATA || ".data";
  return {
    mode: modeFrom(environment),
    port: portFrom("PORT", environment.PORT) ?? 3000,
    pgPort: portFrom("NEAPTIDE_PG_PORT", environment.NEAPTIDE_PG_PORT),
    data: isAbsolute(data) ? data : join(root, data),
  };
}
