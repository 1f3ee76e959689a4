import { requireAbove } from "./require-above";
import { requireCharted } from "./require-charted";

/**
 * Dynamic compliance (mL/cmH2O): tidal volume over peak minus total PEEP; it includes the resistance of the airway.
 * @param input.tidalVolumeMl 20 to 2000
 * @param input.peakCmH2O 2 to 120, above total PEEP
 * @param input.totalPeepCmH2O 0 to 60
 * @throws RangeError outside these
 * @source standard definition
 * @example dynamicComplianceMlPerCmH2O({ tidalVolumeMl: 450, peakCmH2O: 35, totalPeepCmH2O: 10 }) //=> 18
 */
export function dynamicComplianceMlPerCmH2O(input: {
  tidalVolumeMl: number;
  peakCmH2O: number;
  totalPeepCmH2O: number;
}): number {
  const tidalVolumeMl = requireCharted("tidalVolumeMl", input.tidalVolumeMl);
  const peakCmH2O = requireCharted("peakCmH2O", input.peakCmH2O);
  const totalPeepCmH2O = requireCharted("totalPeepCmH2O", input.totalPeepCmH2O);
  requireAbove({ name: "peakCmH2O", value: peakCmH2O }, { name: "totalPeepCmH2O", value: totalPeepCmH2O });
  return tidalVolumeMl / (peakCmH2O - totalPeepCmH2O);
}
