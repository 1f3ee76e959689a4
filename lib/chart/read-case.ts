import type { Ctx } from "@/lib/access/context";
import type { PatientRow } from "@/lib/access/granted";
import type { Facts, Targets } from "@/lib/protocol";
import { factsOf } from "./facts-of";
import { loadEpisodes, type EpisodeRow } from "./queries/load-episodes";
import { loadFactRows } from "./queries/load-facts";
import { loadUnit, type UnitWithPolicy } from "./queries/load-unit";

/** All that one patient is judged by at a moment. */
export interface Case {
  at: Date;
  unit: UnitWithPolicy;
  episode: EpisodeRow;
  targets: Targets;
  facts: Facts;
}

/** The order standing, else the unit's default. */
export function targetsOf(unit: UnitWithPolicy, order: EpisodeRow["order"]): Targets {
  const conditions: Targets["conditions"] = [];
  if (!order) return { conditions, ...unit.defaultTargets, origin: "default" };
  return { conditions, ...order.targets, origin: "order", recordedAt: new Date(order.recordedAt).toISOString() };
}

export async function readCase(
  { transaction }: Ctx,
  { unitId, episodeId }: PatientRow,
  { at, knownAt }: { at: Date; knownAt?: Date | undefined },
): Promise<Case> {
  const [unit, [episode], rows] = [
    await loadUnit({ unitId, at, knownAt }, transaction),
    await loadEpisodes({ episodeIds: [episodeId], at, knownAt }, transaction),
    await loadFactRows({ episodeIds: [episodeId], at, knownAt }, transaction),
  ];
  if (!episode) throw new Error(`episode ${episodeId} was granted and is not there`);
  return { at, unit, episode, targets: targetsOf(unit, episode.order), facts: factsOf(rows) };
}
