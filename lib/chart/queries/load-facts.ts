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

const columns = ["id", "kind", "charted_at", "charted_offset_min", "recorded_at", "author_id", "supersedes_id"];
const of = (alias: string) => columns.map((column) => `${alias}.${column}`).join(", ");

/** Standing entries of a kind with their detail row; `ep` is the episode, `w` the window. */
const entriesOf = (kind: EntryKind, condition: string) => `
  SELECT ${of("e")}, row_to_json(d) AS row FROM chart_entries e JOIN ${detailTables[kind].table} d ON d.entry_id = e.id
  WHERE e.episode_id = ep.id AND e.kind = '${kind}' AND ${condition} AND ${standing}`;

const inWindow = "e.charted_at > w.since AND e.charted_at <= w.until";

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
      SELECT ${of("e")}, row_number() OVER (${newestFirst}) AS place, ARRAY[${wanted.join(", ")}] AS holds
      FROM chart_entries e JOIN ${table} d ON d.entry_id = e.id
      WHERE e.episode_id = ep.id AND e.kind = '${kind}' AND e.charted_at <= w.since AND ${standing}
    ) SELECT ${of("c")}, row_to_json(d) AS row FROM earlier c JOIN ${table} d ON d.entry_id = c.id WHERE c.place IN (
      SELECT min(place) FROM earlier CROSS JOIN LATERAL unnest(holds) WITH ORDINALITY AS h(held, field) WHERE h.held GROUP BY h.field))`;
}

const readings = [
  ...readingKinds.flatMap((kind) => [entriesOf(kind, inWindow), newestEarlier(kind)]),
  entriesOf("settings-checks", inWindow),
  `(${entriesOf("settings-checks", "e.charted_at <= w.since")} ${newestFirst} LIMIT 1)`,
].join(" UNION ALL ");

/** The fold of settings begins at the newest entry with a mode before all that is judged, however old. */
const foldBegins = `
  SELECT e.charted_at FROM chart_entries e JOIN setting_changes d ON d.entry_id = e.id
  WHERE e.episode_id = ep.id AND e.kind = 'settings' AND d.mode IS NOT NULL AND ${standing}
    AND e.charted_at <= LEAST(w.since, (SELECT min(r.charted_at) FROM reading r))
  ${newestFirst} LIMIT 1`;

/** A replacement at the time of what it replaces keeps that entry's place among entries of the same time (rules V1). */
const place = `
  WITH RECURSIVE chain AS (
    SELECT p.id, p.supersedes_id, p.charted_at, p.recorded_at
    UNION ALL
    SELECT o.id, o.supersedes_id, o.charted_at, o.recorded_at FROM chain c
      JOIN chart_entries o ON o.id = c.supersedes_id AND o.charted_at = c.charted_at
  ) SELECT json_build_object('recordedAt', c.recorded_at, 'id', c.id::text) AS kept FROM chain c ORDER BY c.id LIMIT 1`;

const factsOfEpisode = `
  WITH reading AS MATERIALIZED (${readings}),
  picked AS (
    SELECT * FROM reading
    UNION ALL ${entriesOf("settings", `e.charted_at >= COALESCE((${foldBegins}), '-infinity') AND e.charted_at <= w.until`)}
    UNION ALL ${entriesOf("heights", "e.charted_at <= w.until")}
  )
  SELECT p.kind, json_agg(json_build_object(
      'id', p.id::text, 'chartedAt', p.charted_at, 'offsetMinutes', p.charted_offset_min, 'recordedAt', p.recorded_at,
      'place', CASE WHEN p.supersedes_id IS NOT NULL THEN (${place}) END,
      'author', json_build_object('id', u.id::text, 'name', u.name), 'row', p.row
    ) ORDER BY p.charted_at, p.recorded_at, p.id) AS facts
  FROM picked p JOIN users u ON u.id = p.author_id
  GROUP BY p.kind`;

const statement = `
  SELECT ep.id::text AS "episodeId", f.kind, f.facts
  FROM unnest($episodeIds::bigint[]) AS ep(id)
    CROSS JOIN (SELECT $until::timestamptz - interval '48 hours' AS since, $until::timestamptz AS until) w
    CROSS JOIN LATERAL (${factsOfEpisode}) f`;

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
