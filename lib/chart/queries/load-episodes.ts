import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "@/db/connection";
import type { Author, Targets } from "@/lib/protocol";
import { everKnown, newestFirst, standing } from "./standing";

/** An episode with its patient and the newest order standing at a moment; without one the unit's default applies. */
export interface EpisodeRow {
  episodeId: string;
  patientId: string;
  name: string;
  mrn: string;
  birthDate: string;
  intubatedAt: Date;
  endedAt: Date | null;
  pauses: { from: string; until: string | null }[];
  order: { targets: Partial<Omit<Targets, "origin">>; recordedAt: string; author: Author } | null;
}

const pauses = `
  SELECT json_agg(json_build_object('from', s.paused_at, 'until', s.resumed_at) ORDER BY s.paused_at)
  FROM episode_pauses s WHERE s.episode_id = v.id`;

const order = `
  SELECT json_build_object('targets', d.targets, 'recordedAt', e.recorded_at,
    'author', json_build_object('id', u.id::text, 'name', u.name))
  FROM chart_entries e JOIN target_orders d ON d.entry_id = e.id JOIN users u ON u.id = e.author_id
  WHERE e.episode_id = v.id AND e.kind = 'targets' AND e.charted_at <= $at::timestamptz AND ${standing}
  ${newestFirst} LIMIT 1`;

const statement = `
  SELECT v.id::text AS "episodeId", p.id::text AS "patientId", p.name, p.mrn, p.birth_date::text AS "birthDate",
    v.intubated_at AS "intubatedAt", v.ended_at AS "endedAt", COALESCE((${pauses}), '[]') AS pauses, (${order}) AS "order"
  FROM ventilation_episodes v JOIN patients p ON p.id = v.patient_id
  WHERE v.id = ANY ($episodeIds::bigint[])`;

export async function loadEpisodes(
  { episodeIds, at, knownAt }: { episodeIds: readonly string[]; at: Date; knownAt?: Date | undefined },
  transaction: Transaction,
): Promise<EpisodeRow[]> {
  return sequelize.query<EpisodeRow>(statement, {
    type: QueryTypes.SELECT,
    bind: { episodeIds, at, knownAt: knownAt ?? everKnown },
    transaction,
  });
}
