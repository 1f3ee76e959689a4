import { requireCharted } from "./require-charted";
import { requireNotBelow } from "./require-not-below";

/** A total PEEP this much below the set one is a reading's scatter: trapped gas is 0. Common practice. */
const scatterCmH2O = 2;

/**
 * Trapped gas, intrinsic PEEP (cmH2O): total PEEP of an expiratory hold minus set PEEP, never negative.
 * @param input.totalPeepCmH2O 0 to 60, at most 2 below the set PEEP
 * @param input.peepCmH2O 0 to 50, as set
 * @throws RangeError outside these
 * @source standard definition, end-expiratory hold
 * @example intrinsicPeepCmH2O({ totalPeepCmH2O: 14, peepCmH2O: 8 }) //=> 6
 */
export function intrinsicPeepCmH2O(input: { totalPeepCmH2O: number; peepCmH2O: number }): number {
  const totalPeepCmH2O = requireCharted("totalPeepCmH2O", input.totalPeepCmH2O);
  const peepCmH2O = requireCharted("peepCmH2O", input.peepCmH2O);
  requireNotBelow(
    { name: "totalPeepCmH2O", value: totalPeepCmH2O },
    { name: "the lowest plausible reading on the set PEEP,", value: peepCmH2O - scatterCmH2O },
  );
  return Math.max(0, totalPeepCmH2O - peepCmH2O);
}
