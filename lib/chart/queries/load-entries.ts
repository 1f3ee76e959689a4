import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "@/db/connection";
import { entryKinds, type EntryKind } from "@/lib/contracts";
import { detailTables } from "../detail-tables";

/** One row of the record, whatever became of it: superseded and void ones included. */
export interface EntryRow {
  id: string;
  kind: EntryKind;
  submissionId: string;
  chartedAt: Date;
  offsetMinutes: number;
  recordedAt: Date;
  author: { id: string; name: string };
  correction: "replace" | "void" | null;
  supersedesId: string | null;
  supersededById: string | null;
  reason: string | null;
  /** The detail row under its columns' names; null in a void. */
  row: Record<string, unknown> | null;
}

export interface EntryFilter {
  episodeId: string;
  id?: string | undefined;
  submissionId?: string | undefined;
  kind?: EntryKind | undefined;
  /** A column of a detail table: entries that chart it, and what superseded or voided them. */
  column?: string | undefined;
  /** Entries older than this one, or charted before this moment. */
  before?: { entryId: string } | { at: Date } | undefined;
  limit?: number;
}

const kindsInOrder = Object.keys(detailTables) as EntryKind[];
const alias = (kind: EntryKind) => `d${kindsInOrder.indexOf(kind)}`;
const detailJoins = kindsInOrder
  .map(
    (kind) =>
      `LEFT JOIN ${detailTables[kind].table} ${alias(kind)} ON ${alias(kind)}.entry_id = e.id AND e.kind = '${kind}'`,
  )
  .join("\n  ");
const detailRow = `COALESCE(${kindsInOrder.map((kind) => `to_jsonb(${alias(kind)})`).join(", ")})`;

/** Of an entry and, for a correction or void, of what it supersedes: a history shows both. */
const chartsColumn = kindsInOrder
  .map(
    (kind) =>
      `EXISTS (SELECT FROM ${detailTables[kind].table} f WHERE f.entry_id IN (e.id, e.supersedes_id) AND to_jsonb(f) ->> $column::text IS NOT NULL)`,
  )
  .join(" OR ");

const statement = `
  SELECT e.id::text AS id, e.kind, e.submission_id::text AS "submissionId", e.charted_at AS "chartedAt",
    e.charted_offset_min AS "offsetMinutes", e.recorded_at AS "recordedAt",
    json_build_object('id', u.id::text, 'name', u.name) AS author, e.correction, e.supersedes_id::text AS "supersedesId",
    s.id::text AS "supersededById", e.reason, ${detailRow} AS row
  FROM chart_entries e JOIN users u ON u.id = e.author_id LEFT JOIN chart_entries s ON s.supersedes_id = e.id
  ${detailJoins}
  WHERE e.episode_id = $episodeId::bigint AND e.kind = ANY ($kinds::text[])
    AND ($id::bigint IS NULL OR e.id = $id::bigint)
    AND ($submissionId::bigint IS NULL OR e.submission_id = $submissionId::bigint)
    AND ($column::text IS NULL OR ${chartsColumn})
    AND ($beforeAt::timestamptz IS NULL OR e.charted_at < $beforeAt::timestamptz)
    AND ($beforeId::bigint IS NULL OR (e.charted_at, e.recorded_at, e.id) <
      (SELECT b.charted_at, b.recorded_at, b.id FROM chart_entries b WHERE b.id = $beforeId::bigint AND b.episode_id = e.episode_id))
  ORDER BY e.charted_at DESC, e.recorded_at DESC, e.id DESC
  LIMIT $limit::int`;

/** The record of an episode, newest first. */
export async function loadEntries(filter: EntryFilter, transaction: Transaction): Promise<EntryRow[]> {
  const { episodeId, id = null, submissionId = null, kind, column = null, before, limit = null } = filter;
  return sequelize.query<EntryRow>(statement, {
    type: QueryTypes.SELECT,
    bind: {
      episodeId,
      id,
      submissionId,
      kinds: kind ? [kind] : [...entryKinds],
      column,
      beforeId: before && "entryId" in before ? before.entryId : null,
      beforeAt: before && "at" in before ? before.at : null,
      limit,
    },
    transaction,
  });
}
