import { AuditEvent } from "@/db/models";
import type { Ctx } from "@/lib/access/context";
import type { PatientRow, UnitRow } from "@/lib/access/granted";

/** Reads of one person and patient within this time are one line. */
const READ_WINDOW_MS = 15 * 60_000;

interface Change {
  action: string;
  subject?: string;
  subjectId?: string;
  newValues?: object;
}

function common({ actor, now, requestId }: Ctx, row: UnitRow & Partial<PatientRow>) {
  const { hospitalId, unitId, patientId = null } = row;
  return {
    recordedAt: now,
    actorId: actor.userId,
    requestId,
    hospitalId,
    unitId,
    patientId,
    oldValues: null,
    submissionId: null,
  };
}

/** One line for what was filed, in the transaction that files it. */
export async function auditChange(ctx: Ctx, row: UnitRow & Partial<PatientRow>, change: Change): Promise<void> {
  const { action, subject = null, subjectId = null, newValues = null } = change;
  const { submissionId, transaction } = ctx;
  await AuditEvent.create(
    { ...common(ctx, row), submissionId, action, subject, subjectId, newValues, dedupeKey: null },
    { transaction },
  );
}

/**
 * Who looked at what: polls of the same screen within a quarter of an hour add nothing. Called after the reading, since
 * a second poll waits on this row until the first one's transaction ends.
 */
export async function auditRead(ctx: Ctx, row: UnitRow & Partial<PatientRow>, action: string): Promise<void> {
  const window = Math.floor(ctx.now.getTime() / READ_WINDOW_MS);
  const dedupeKey = [action, ctx.actor.userId, row.patientId ?? `unit-${row.unitId}`, window].join(":");
  await AuditEvent.bulkCreate(
    [{ ...common(ctx, row), action, subject: null, subjectId: null, newValues: null, dedupeKey }],
    { ignoreDuplicates: true, transaction: ctx.transaction },
  );
}
