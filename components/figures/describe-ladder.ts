import { displayNumber, inwardMillilitres } from "@/lib/format";
import type { Limit } from "@/lib/protocol/result";
import type { LadderReading, VolumeLadderProps } from "./ladder-reading";
import { stateWord } from "./state-word";

/** '420 mL, 6.0 mL/kg, inside': the flag's words, and the first of the text alternative. */
export function flagWords(reading: LadderReading, order: Limit | null): string {
  const limit = countsAsOnLimit(reading, order) ? [] : [order?.min, order?.max].filter((each) => each !== undefined);
  const perKg = displayNumber({ value: reading.mlPerKg, decimals: 1, limit });
  const ml = displayNumber({ value: reading.tidalVolumeMl, decimals: 0 });
  return `${ml} mL${reading.set ? " set" : ""}, ${perKg} mL/kg, ${stateWord(reading.state)}`;
}

/** A set volume within half a machine step beyond a limit counts as on it: more decimals would deny that. */
function countsAsOnLimit({ mlPerKg, state }: LadderReading, order: Limit | null): boolean {
  return state === "edge" && (mlPerKg > (order?.max ?? Infinity) || mlPerKg < (order?.min ?? -Infinity));
}

/** The same as the drawing, as sentences. */
export function describeLadder({ pbwKg, order, reading, note }: VolumeLadderProps & { pbwKg: number }): string {
  const marker = reading === null ? "no tidal volume" : flagWords(reading, order);
  return [`Volume ladder: ${marker}`, orderWords(order, pbwKg), note].filter(Boolean).join(". ") + ".";
}

function orderWords(order: Limit | null, pbwKg: number): string {
  if (order?.max === undefined) return order?.min === undefined ? "No range in mL/kg" : `At least ${order.min} mL/kg`;
  const word = order.origin === "order" ? "Ordered" : "Default";
  const { minMl, maxMl } = inwardMillilitres({ minMlPerKg: order.min, maxMlPerKg: order.max, pbwKg });
  if (order.min === undefined) return `${word} up to ${order.max} mL/kg, ${maxMl} mL`;
  return `${word} ${order.min} to ${order.max} mL/kg, ${minMl} to ${maxMl} mL`;
}
