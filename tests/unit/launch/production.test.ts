import { afterEach, describe, expect, it, vi } from "vitest";
import { productionMigration, productionValues, weaknessOf } from "@/lib/launch/production.mjs";

const complete = {
  DATABASE_URL: "postgres://ward_app:pw@db.example.org:5432/neaptide",
  NEXTAUTH_SECRET: "q7Zr1mXw9LtB4vKc8NfH2sYd6PgJ3aUe",
  NEXTAUTH_URL: "https://neaptide.example.org",
};

describe("production mode", () => {
  it("passes on the three values it needs, and its mode", () => {
    expect(productionValues(complete)).toEqual({ NEAPTIDE_MODE: "production", ...complete });
  });

  it("the owner's address never reaches the server", () => {
    const values = productionValues({ ...complete, MIGRATION_DATABASE_URL: "postgres://owner@db/neaptide" });
    expect(Object.keys(values)).not.toContain("MIGRATION_DATABASE_URL");
  });

  it.each(Object.keys(complete))("refuses to start without %s and names it", (name) => {
    expect(() => productionValues({ ...complete, [name]: "" })).toThrow(name);
  });

  it("a migration grants to the user of DATABASE_URL unless APP_DATABASE_ROLE says another", () => {
    const owner = { MIGRATION_DATABASE_URL: "postgres://owner@db/neaptide" };
    expect(productionMigration({ ...owner, DATABASE_URL: complete.DATABASE_URL }).appRole).toBe("ward_app");
    expect(productionMigration({ ...owner, APP_DATABASE_ROLE: "bedside" }).appRole).toBe("bedside");
    expect(productionMigration(owner).appRole).toBe("neaptide_app");
  });

  it("a migration without the owner's address is refused", () => {
    expect(() => productionMigration({})).toThrow("MIGRATION_DATABASE_URL");
  });
});

describe("a signing secret", () => {
  const secrets = ["", "secret", "a".repeat(64), "abcabcabc".repeat(8), complete.NEXTAUTH_SECRET.slice(1)];

  afterEach(() => vi.unstubAllEnvs());

  async function serverAccepts(secret: string) {
    vi.resetModules();
    const values = { ...complete, NEAPTIDE_MODE: "production", NEXTAUTH_SECRET: secret };
    Object.entries(values).forEach(([name, value]) => vi.stubEnv(name, value));
    const { env } = await import("@/lib/env");
    try {
      return env().NEXTAUTH_SECRET === secret;
    } catch {
      return false;
    }
  }

  it.each(secrets)("'%s' is weak for the launcher and for the server", async (secret) => {
    expect(weaknessOf(secret)).toBeTypeOf("string");
    expect(await serverAccepts(secret)).toBe(false);
  });

  it("of 32 random characters is strong enough for both", async () => {
    expect(weaknessOf(complete.NEXTAUTH_SECRET)).toBeUndefined();
    expect(await serverAccepts(complete.NEXTAUTH_SECRET)).toBe(true);
  });
});
