import { requireAbove } from "./require-above";
import { requireCharted } from "./require-charted";

/**
 * Driving pressure (cmH2O): plateau minus total PEEP. Valid without patient effort.
 * @param input.plateauCmH2O 2 to 100, above total PEEP
 * @param input.totalPeepCmH2O 0 to 60
 * @throws RangeError outside these
 * @source Amato, N Engl J Med 2015;372:747
 * @example drivingPressureCmH2O({ plateauCmH2O: 27, totalPeepCmH2O: 12 }) //=> 15
 */
export function drivingPressureCmH2O(input: { plateauCmH2O: number; totalPeepCmH2O: number }): number {
  const plateauCmH2O = requireCharted("plateauCmH2O", input.plateauCmH2O);
  const totalPeepCmH2O = requireCharted("totalPeepCmH2O", input.totalPeepCmH2O);
  requireAbove({ name: "plateauCmH2O", value: plateauCmH2O }, { name: "totalPeepCmH2O", value: totalPeepCmH2O });
  return plateauCmH2O - totalPeepCmH2O;
}
