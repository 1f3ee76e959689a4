import { readinessFaults } from "@/db/readiness";
import { AppError } from "@/lib/contracts";
import { errorFacts } from "./error-facts";
import { log } from "./log";

/**
 * @throws AppError `not-ready`: the database does not answer, a migration has not run, or the record could be rewritten.
 * What exactly stands in the log; the answer is public.
 */
export async function assertReady(): Promise<void> {
  const faults = await readinessFaults().catch((cause: unknown) => {
    log.error({ error: errorFacts(cause) }, "the database does not answer");
    throw new AppError("not-ready", "The database does not answer.", { cause });
  });
  if (faults.length === 0) return;
  log.error({ faults }, "not ready");
  throw new AppError("not-ready", "The database is not as this release needs it; the log says what is wrong.");
}
