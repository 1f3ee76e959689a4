import { join } from "node:path";
import { SUPERUSER } from "./make-cluster.mjs";
import { postgresEnvironment } from "./postgres-environment.mjs";
import { capture } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";

/** Runs a script through psql and answers what it prints, unaligned and without headers. Stops at the first error. */
export async function runSql(
  cluster,
  script,
  { database = "postgres", user = SUPERUSER, password = cluster.password } = {},
) {
  const connection = ["-h", "127.0.0.1", "-p", String(cluster.port), "-U", user, "-d", database];
  const quiet = ["-X", "-q", "-A", "-t", "-w", "-v", "ON_ERROR_STOP=1", "-f", "-"];
  const env = { ...postgresEnvironment(), PGPASSWORD: password, PGCONNECT_TIMEOUT: "10" };
  const answer = await capture(join(cluster.programs, "psql"), [...connection, ...quiet], {
    cwd: "/",
    env,
    input: script,
  });
  if (answer.code !== 0) throw new Refusal(`PostgreSQL refused:\n${answer.stderr.trimEnd()}`);
  return answer.stdout.trim();
}
