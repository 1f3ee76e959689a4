import { afterAll } from "vitest";
import { createTestDatabase } from "./database";

// Runs before a test file's own imports: the application's modules find the environment of a server in test mode.
const database = await createTestDatabase();

Object.assign(process.env, {
  NEAPTIDE_MODE: "test",
  DATABASE_URL: database.appUrl,
  // The owner's address has no place in a server; tests that act as the owner take it from here by name.
  TEST_DATABASE_OWNER_URL: database.ownerUrl,
  NEXTAUTH_URL: process.env.NEXTAUTH_URL ?? "http://127.0.0.1:3000",
  NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET ?? "integration-tests-only-0123456789-abcdefgh",
});

afterAll(async () => {
  const { sequelize } = await import("@/db/connection");
  await sequelize.close();
  await database.drop();
});
