import { requireCharted } from "./require-charted";
import { requireNotBelow } from "./require-not-below";

/**
 * Airway resistance (cmH2O/(L/s)): peak minus plateau over flow. Valid with constant flow in volume control only.
 * @param input.peakCmH2O 2 to 120, not below plateau
 * @param input.plateauCmH2O 2 to 100
 * @param input.flowLPerMin 5 to 200
 * @throws RangeError outside these
 * @source equation of motion, constant inspiratory flow
 * @example airwayResistanceCmH2OPerLPerS({ peakCmH2O: 35, plateauCmH2O: 25, flowLPerMin: 60 }) //=> 10
 */
export function airwayResistanceCmH2OPerLPerS(input: {
  peakCmH2O: number;
  plateauCmH2O: number;
  flowLPerMin: number;
}): number {
  const peakCmH2O = requireCharted("peakCmH2O", input.peakCmH2O);
  const plateauCmH2O = requireCharted("plateauCmH2O", input.plateauCmH2O);
  const flowLPerMin = requireCharted("flowLPerMin", input.flowLPerMin);
  requireNotBelow({ name: "peakCmH2O", value: peakCmH2O }, { name: "plateauCmH2O", value: plateauCmH2O });
  return Math.max(0, peakCmH2O - plateauCmH2O) / (flowLPerMin / 60);
}
