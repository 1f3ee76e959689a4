import { Refusal } from "./refusal.mjs";

const SECRET_LENGTH = 32;
const SECRET_CHARACTERS = 12;
const RANDOM = "openssl rand -base64 32";

/** Why a signing secret is too weak, or undefined. lib/env.ts holds the same rule for the server itself. */
export function weaknessOf(secret) {
  if (secret.length < SECRET_LENGTH) return `shorter than ${SECRET_LENGTH} characters`;
  if (new Set(secret).size < SECRET_CHARACTERS) return "made of too few different characters";
  return undefined;
}

function required(environment, names) {
  const missing = names.filter((name) => !environment[name]);
  if (missing.length === 0) return;
  throw new Refusal(`NEAPTIDE_MODE=production needs ${missing.join(", ")}; .env.example says what each is.`);
}

/** What the server gets in production. Throws Refusal when something is missing or the secret is weak. */
export function productionValues(environment) {
  required(environment, ["DATABASE_URL", "NEXTAUTH_SECRET", "NEXTAUTH_URL"]);
  const { DATABASE_URL, NEXTAUTH_SECRET, NEXTAUTH_URL } = environment;
  const weakness = weaknessOf(NEXTAUTH_SECRET);
  if (weakness) throw new Refusal(`NEXTAUTH_SECRET is ${weakness}. Make one with: ${RANDOM}`);
  return { NEAPTIDE_MODE: "production", DATABASE_URL, NEXTAUTH_SECRET, NEXTAUTH_URL };
}

function userOf(address) {
  return URL.canParse(address) ? decodeURIComponent(new URL(address).username) : "";
}

/** What a migration gets in production: the owner's address, and the role to grant to. */
export function productionMigration(environment) {
  required(environment, ["MIGRATION_DATABASE_URL"]);
  const appRole = environment.APP_DATABASE_ROLE || userOf(environment.DATABASE_URL ?? "") || "neaptide_app";
  return { ownerUrl: environment.MIGRATION_DATABASE_URL, appRole };
}
