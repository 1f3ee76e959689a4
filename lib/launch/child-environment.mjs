import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { root } from "./settings.mjs";

/** Every process of a data folder carries this, so that a later launcher knows which ones were left behind. */
export const MARK = "NEAPTIDE_LAUNCHED_FOR";

// NODE_ENV belongs to Next's own commands.
const KEPT_BACK = /^(NODE_ENV|DATABASE_URL|MIGRATION_DATABASE_URL|APP_DATABASE_ROLE)$/;
// These would redirect or refuse the demo's own connection; in production they may carry its certificates.
const POSTGRES_DEFAULTS = /^PG[A-Z]+$/;

const isKept = (name) =>
  !KEPT_BACK.test(name) && (process.env.NEAPTIDE_MODE === "production" || !POSTGRES_DEFAULTS.test(name));

// Next reads .env by itself; an empty value is what keeps the owner's address there out of the web process.
function ownerAddressInEnvFile() {
  const path = join(root, ".env");
  return existsSync(path) && /^\s*(export\s+)?MIGRATION_DATABASE_URL\s*=/m.test(readFileSync(path, "utf8"));
}

/** The environment for a program the launcher starts: the caller's, less database addresses, plus `values`. */
export function childEnvironment(data, values = {}) {
  const kept = Object.entries(process.env).filter(([name]) => isKept(name));
  return {
    ...Object.fromEntries(kept),
    NEXT_TELEMETRY_DISABLED: "1",
    ...(data ? { [MARK]: data } : {}),
    ...(ownerAddressInEnvFile() ? { MIGRATION_DATABASE_URL: "" } : {}),
    ...values,
  };
}
