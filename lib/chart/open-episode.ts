import type { Ctx } from "@/lib/access/context";
import type { PatientRow } from "@/lib/access/granted";
import { AppError } from "@/lib/contracts";
import { lockEpisode, type LockedEpisode } from "./queries/lock-episode";

/** Locks the episode for charting; what was read before it is not to be trusted. */
export async function openEpisode({ transaction }: Ctx, { episodeId }: PatientRow): Promise<LockedEpisode> {
  const episode = await lockEpisode(episodeId, transaction);
  if (episode.endedAt) throw new AppError("conflict", "This episode has ended: nothing more is charted on it.");
  return episode;
}
