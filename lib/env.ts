import { z } from "zod";

/** Fewer distinct characters than this is a phrase typed by hand or a repeated word, not a random secret. */
const MIN_DISTINCT_SECRET_CHARACTERS = 12;

const secretSchema = z
  .string()
  .min(32, "NEXTAUTH_SECRET needs at least 32 characters: openssl rand -base64 32")
  .refine(
    (secret) => new Set(secret).size >= MIN_DISTINCT_SECRET_CHARACTERS,
    "NEXTAUTH_SECRET repeats too few characters: openssl rand -base64 32",
  );

const postgresUrl = z.url({ protocol: /^postgres(ql)?$/, hostname: /.+/ });

const serverSchema = z.object({
  NEAPTIDE_MODE: z.enum(["production", "demo", "test"]),
  DATABASE_URL: postgresUrl,
  NEXTAUTH_SECRET: secretSchema,
  NEXTAUTH_URL: z.url({ protocol: /^https?$/ }),
});

const poolSchema = z.object({
  DATABASE_POOL_MAX: z.coerce.number().int().min(1).max(100).default(5),
  DATABASE_LOG_SQL: z.enum(["0", "1"]).default("0"),
});

const migrationSchema = z.object({
  MIGRATION_DATABASE_URL: postgresUrl,
  APP_DATABASE_ROLE: z
    .string()
    .regex(/^[a-z_][a-z0-9_]{0,62}$/, "APP_DATABASE_ROLE is the name of a PostgreSQL role in lower case")
    .default("neaptide_app"),
});

function parse<Schema extends z.ZodType>(schema: Schema): z.output<Schema> {
  const result = schema.safeParse(process.env);
  if (result.success) return result.data;
  // The values stay out of the message: they are secrets, and messages reach logs.
  const reasons = result.error.issues.map((issue) => `${issue.path.join(".")}: ${issue.message}`);
  throw new Error(`The environment is not complete (see .env.example). ${reasons.join("; ")}`);
}

export type ServerEnvironment = z.output<typeof serverSchema>;
export type MigrationEnvironment = z.output<typeof migrationSchema>;

let server: ServerEnvironment | undefined;
let migration: MigrationEnvironment | undefined;

/** What the server needs. Read at the first call, not at import, because `next build` imports routes without a database. */
export function env(): ServerEnvironment {
  return (server ??= parse(serverSchema));
}

/** What a migration needs; the web process has none of it. */
export function migrationEnv(): MigrationEnvironment {
  return (migration ??= parse(migrationSchema));
}

/** How the connection pool behaves. Every part has a default, so it can be read at import. */
export function poolEnv(): z.output<typeof poolSchema> {
  return parse(poolSchema);
}

/** Next's own development server, whose scripts need a looser policy. */
export function isDevelopment(): boolean {
  return process.env.NODE_ENV === "development";
}
