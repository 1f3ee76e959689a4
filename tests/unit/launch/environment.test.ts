import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { childEnvironment } from "@/lib/launch/child-environment.mjs";

const server = {
  NEAPTIDE_MODE: "demo",
  DATABASE_URL: "postgres://neaptide_app:pw@127.0.0.1:5433/neaptide",
  NEXTAUTH_SECRET: "q7Zr1mXw9LtB4vKc8NfH2sYd6PgJ3aUe",
  NEXTAUTH_URL: "http://127.0.0.1:3000",
};

async function freshEnv(values: Record<string, string | undefined>) {
  vi.resetModules();
  Object.entries(values).forEach(([name, value]) => vi.stubEnv(name, value));
  return import("@/lib/env");
}

afterEach(() => vi.unstubAllEnvs());

describe("lib/env", () => {
  it("can be imported without any of its values, as a build does", async () => {
    const { env } = await freshEnv({ ...server, DATABASE_URL: undefined });
    expect(() => env()).toThrow(/DATABASE_URL/);
  });

  it("reads what the server needs", async () => {
    const { env } = await freshEnv(server);
    expect(env()).toEqual(server);
  });

  it("never repeats a value in its message", async () => {
    const { env } = await freshEnv({ ...server, DATABASE_URL: "mysql://root:hunter2@db/x" });
    expect(() => env()).toThrow(/^((?!hunter2).)*$/s);
  });

  it("refuses a role name that could not stand unquoted in a grant", async () => {
    const { migrationEnv } = await freshEnv({
      MIGRATION_DATABASE_URL: "postgres://neaptide_owner:pw@127.0.0.1:5433/neaptide",
      APP_DATABASE_ROLE: 'app"; drop table x',
    });
    expect(() => migrationEnv()).toThrow(/APP_DATABASE_ROLE/);
  });
});

describe("the environment of what the launcher starts", () => {
  beforeEach(() => {
    vi.stubEnv("MIGRATION_DATABASE_URL", "postgres://owner@db/neaptide");
    vi.stubEnv("DATABASE_URL", "postgres://app@db/neaptide");
    vi.stubEnv("PGHOST", "db.example.org");
  });

  it("carries no address but the one it is given", () => {
    const environment = childEnvironment("/srv/tide", { DATABASE_URL: server.DATABASE_URL });
    expect(environment).toMatchObject({ DATABASE_URL: server.DATABASE_URL });
    expect(environment).not.toHaveProperty("MIGRATION_DATABASE_URL");
  });

  it("drops PostgreSQL's own variables in the demo and keeps them in production", () => {
    expect(childEnvironment("/srv/tide")).not.toHaveProperty("PGHOST");
    vi.stubEnv("NEAPTIDE_MODE", "production");
    expect(childEnvironment("/srv/tide")).toHaveProperty("PGHOST", "db.example.org");
  });
});
