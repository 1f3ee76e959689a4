import { inwardMillilitres, roundHalfUp } from "@/lib/format";
import type { Limit } from "@/lib/protocol/result";
import { ladderEnds } from "./ladder-reading";

export interface Rung {
  mlPerKg: number;
  /** Millilitres at this patient's PBW: an ordered limit rounded inward, any other half-up. */
  ml: number;
  limit: boolean;
  /** Between the ordered limits, or on one. */
  ordered: boolean;
  /** False where the words would run into those of an ordered limit close by. */
  labelled: boolean;
}

const plainRungs = [4, 5, 6, 7, 8, 10, 12];

/** The ladder's rungs for one patient, ascending. `labelRoom` is how much of the ladder one label takes, mL/kg. */
export function ladderRungs(ladder: { pbwKg: number; order: Limit | null; labelRoom: number }): Rung[] {
  const { pbwKg, order, labelRoom } = ladder;
  const limits = [order?.min, order?.max].filter((limit) => limit !== undefined).filter(isOnLadder);
  const all = [...new Set([...plainRungs, ...limits])].sort((a, b) => a - b);
  return all.map((mlPerKg) => {
    const limit = limits.includes(mlPerKg);
    return {
      mlPerKg,
      ml: limit ? limitMl(mlPerKg, order, pbwKg) : roundHalfUp(mlPerKg * pbwKg, 0),
      limit,
      ordered: order !== null && mlPerKg >= (order.min ?? -Infinity) && mlPerKg <= (order.max ?? Infinity),
      labelled: limit || limits.every((other) => Math.abs(other - mlPerKg) >= labelRoom),
    };
  });
}

function limitMl(mlPerKg: number, order: Limit | null, pbwKg: number): number {
  const inward = inwardMillilitres({ minMlPerKg: mlPerKg, maxMlPerKg: mlPerKg, pbwKg });
  return mlPerKg === order?.min ? (inward.minMl ?? inward.maxMl) : inward.maxMl;
}

function isOnLadder(mlPerKg: number): boolean {
  return mlPerKg >= ladderEnds.from && mlPerKg <= ladderEnds.to;
}
