import { canOf } from "@/lib/access/can-of";
import type { Ctx } from "@/lib/access/context";
import type { GrantedPatient } from "@/lib/access/granted";
import type { Worksheet } from "@/lib/contracts";
import type { Facts } from "@/lib/protocol";
import { auditRead } from "./audit";
import { readCase } from "./read-case";
import { worksheetOf } from "./worksheet-of";

interface WorksheetQuery {
  /** The moment that is judged. */
  at?: Date | undefined;
  /** What stood on record then; everything recorded since is left out. */
  knownAt?: Date | undefined;
  /** With the facts themselves, for the live result while typing. */
  facts?: boolean | undefined;
}

function shownFacts(facts: Facts): NonNullable<Worksheet["facts"]> {
  return Object.fromEntries(
    Object.entries(facts).map(([kind, items]) => [kind, items.map((item: object) => ({ ...item }))]),
  );
}

/** One patient's worksheet, as it is or as it was at any moment. */
export async function readWorksheet(
  ctx: Ctx,
  granted: GrantedPatient<"patients:read">,
  { at = ctx.now, knownAt, facts = false }: WorksheetQuery = {},
): Promise<Worksheet> {
  const patientCase = await readCase(ctx, granted, { at, knownAt });
  await auditRead(ctx, granted, "worksheet.read");
  const worksheet = worksheetOf(patientCase, { bed: granted.bed, can: canOf(granted) });
  return facts ? { ...worksheet, facts: shownFacts(patientCase.facts) } : worksheet;
}
