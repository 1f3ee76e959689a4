import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "@/db/connection";
import type { EntryKind } from "@/lib/contracts";
import { detailTables } from "../detail-tables";
import { everKnown, newestFirst, standing } from "./standing";

/** One standing entry, as the statement below gives it: `row` is its detail row under the columns' names. */
export interface FactRow {
  id: string;
  chartedAt: string;
  offsetMinutes: number;
  recordedAt: string;
  place: { recordedAt: string; id: string } | null;
  author: { id: string; name: string };
  row: Record<string, unknown>;
}

export interface EpisodeFactRows {
  episodeId: string;
  kind: EntryKind;
  facts: FactRow[];
}

/** Kinds of which every value serves only for a time: 48 h of them, and what is newest of each field before. */
const readingKinds = ["mechanics", "observations"] as const satisfies readonly EntryKind[];

const chosen = `e.id, e.kind, e.charted_at`;

/** A hold that can be judged inside may be older than the newest plateau (rules V8, F9). */
const alsoWanted: Partial<Record<EntryKind, string[]>> = {
  mechanics: ["d.hold IN ('relaxed', 'not-possible')", "d.hold = 'relaxed' AND d.plateau_cm_h2o IS NOT NULL"],
};

/**
 * Of each field the newest entry before the window, found in one pass over what is older. A probe for every field made
 * the planner take longer than the reading itself.
 */
function newestEarlier(kind: (typeof readingKinds)[number]): string {
  const { table, columnOf } = detailTables[kind];
  const wanted = [...columnOf.values()].map((column) => `d.${column} IS NOT NULL`).concat(alsoWanted[kind] ?? []);
  return `(WITH earlier AS (
      SELECT ${chosen}, row_number() OVER (${newestFirst}) AS place, ARRAY[${wanted.join(", ")}] AS holds
      FROM chart_entries e JOIN ${table} d ON d.entry_id = e.id
      WHERE e.episode_id = ep.id AND e.kind = '${kind}' AND e.charted_at <= w.since AND ${standing}
    ) SELECT id, kind, charted_at FROM earlier WHERE place IN (
      SELECT min(place) FROM earlier CROSS JOIN LATERAL unnest(holds) WITH ORDINALITY AS h(held, field) WHERE h.held GROUP BY h.field))`;
}

const readings = `
  SELECT ep.id AS episode_id, x.* FROM episode ep CROSS JOIN span w CROSS JOIN LATERAL (
    SELECT ${chosen} FROM chart_entries e WHERE e.episode_id = ep.id AND e.kind IN ('mechanics', 'observations', 'settings-checks')
      AND e.charted_at > w.since AND e.charted_at <= w.until AND ${standing}
    UNION ${readingKinds.map(newestEarlier).join(" UNION ")}
    UNION (SELECT ${chosen} FROM chart_entries e WHERE e.episode_id = ep.id AND e.kind = 'settings-checks'
      AND e.charted_at <= w.since AND ${standing} ${newestFirst} LIMIT 1)
  ) x`;

/** The fold of settings begins at the newest entry with a mode before all that is judged, however old. */
const settingsSince = `
  SELECT ep.id AS episode_id, COALESCE((
    SELECT e.charted_at FROM chart_entries e JOIN setting_changes d ON d.entry_id = e.id
    WHERE e.episode_id = ep.id AND e.kind = 'settings' AND d.mode IS NOT NULL AND ${standing}
      AND e.charted_at <= LEAST(w.since, (SELECT min(r.charted_at) FROM reading r WHERE r.episode_id = ep.id))
    ${newestFirst} LIMIT 1), '-infinity') AS since
  FROM episode ep CROSS JOIN span w`;

const settingsAndHeights = `
  SELECT ep.id AS episode_id, x.* FROM episode ep CROSS JOIN span w JOIN settings_since f ON f.episode_id = ep.id CROSS JOIN LATERAL (
    SELECT ${chosen} FROM chart_entries e WHERE e.episode_id = ep.id AND e.kind = 'settings'
      AND e.charted_at >= f.since AND e.charted_at <= w.until AND ${standing}
    UNION ALL
    SELECT ${chosen} FROM chart_entries e WHERE e.episode_id = ep.id AND e.kind = 'heights' AND e.charted_at <= w.until AND ${standing}
  ) x`;

const details = (Object.keys(detailTables) as EntryKind[])
  .map(
    (kind) =>
      `SELECT p.*, to_jsonb(d) AS row FROM picked p JOIN ${detailTables[kind].table} d ON d.entry_id = p.id WHERE p.kind = '${kind}'`,
  )
  .join(" UNION ALL ");

/** A replacement at the time of what it replaces keeps that entry's place among entries of the same time (rules V1). */
const place = `
  WITH RECURSIVE chain AS (
    SELECT e.id, e.supersedes_id, e.charted_at, e.recorded_at
    UNION ALL
    SELECT o.id, o.supersedes_id, o.charted_at, o.recorded_at FROM chain c
      JOIN chart_entries o ON o.id = c.supersedes_id AND o.charted_at = c.charted_at
  ) SELECT json_build_object('recordedAt', c.recorded_at, 'id', c.id::text) AS kept FROM chain c ORDER BY c.id LIMIT 1`;

const statement = `
  WITH episode AS (SELECT unnest($episodeIds::bigint[]) AS id),
  span AS (SELECT $until::timestamptz - interval '48 hours' AS since, $until::timestamptz AS until),
  reading AS MATERIALIZED (${readings}),
  settings_since AS (${settingsSince}),
  picked AS MATERIALIZED (SELECT * FROM reading UNION ALL ${settingsAndHeights}),
  detail AS (${details})
  SELECT detail.episode_id::text AS "episodeId", detail.kind, json_agg(json_build_object(
      'id', e.id::text, 'chartedAt', e.charted_at, 'offsetMinutes', e.charted_offset_min, 'recordedAt', e.recorded_at,
      'place', place.kept, 'author', json_build_object('id', u.id::text, 'name', u.name), 'row', detail.row
    ) ORDER BY e.charted_at, e.recorded_at, e.id) AS facts
  FROM detail JOIN chart_entries e ON e.id = detail.id JOIN users u ON u.id = e.author_id
    LEFT JOIN LATERAL (${place}) place ON e.supersedes_id IS NOT NULL
  GROUP BY detail.episode_id, detail.kind`;

/**
 * What is needed to judge these episodes at `at`, in one round trip: per kind 48 h, of each field the whole entry that
 * holds its newest earlier value, and settings back to the newest entry with a mode before any of it.
 */
export async function loadFactRows(
  { episodeIds, at, knownAt }: { episodeIds: readonly string[]; at: Date; knownAt?: Date | undefined },
  transaction: Transaction,
): Promise<EpisodeFactRows[]> {
  return sequelize.query<EpisodeFactRows>(statement, {
    type: QueryTypes.SELECT,
    bind: { episodeIds, until: at, knownAt: knownAt ?? everKnown },
    transaction,
  });
}
