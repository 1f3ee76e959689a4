import type { Worksheet } from "@/lib/contracts";
import type { Facts } from "@/lib/protocol/facts";
import type { EpisodeFacts, Targets, UnitPolicy } from "@/lib/protocol/targets";

/** What the core judges by, from the worksheet's answer: the contract's shapes are the core's, only wider. */
export interface CoreInput {
  facts: Facts;
  targets: Targets;
  unit: UnitPolicy;
  episode: EpisodeFacts;
}

export function coreInputOf(worksheet: Worksheet): CoreInput {
  const { facts, targets, unit, episode } = worksheet;
  return {
    facts: (facts ?? {}) as unknown as Facts,
    targets: targets as Targets,
    unit: {
      barometricPressureMmHg: unit.barometricPressureMmHg,
      timeZone: unit.timeZone,
      intervals: unit.intervals,
      steps: unit.steps,
    },
    episode: { intubatedAt: episode.intubatedAt, pauses: episode.pauses, endedAt: episode.endedAt },
  };
}
