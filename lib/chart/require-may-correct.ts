import { refusedByCorrection } from "@/lib/access/corrections";
import type { PatientRow } from "@/lib/access/granted";
import { AppError } from "@/lib/contracts";
import { bodyOf } from "./detail-tables";
import type { EntryRow } from "./queries/load-entries";

const notOfTheRecord = new Set(["reason", "chartedAt"]);

/** Correcting is of the kinds one may chart: a nurse's settings entry is FiO2 alone, before and after. */
export function requireMayCorrect(
  { member, policy }: PatientRow,
  { kind, row }: EntryRow,
  replacement?: unknown,
): void {
  const charted = Object.keys(row ? bodyOf(kind, row) : {}).filter((name) => !notOfTheRecord.has(name));
  const names = refusedByCorrection(member, policy, { kind, charted, entry: replacement });
  if (names.length === 0) return;
  throw new AppError("forbidden", `Your role may not correct this here: ${names.join(", ")}.`, {
    errors: names.map((path) => ({ path, message: "Your role may not chart this here." })),
  });
}
