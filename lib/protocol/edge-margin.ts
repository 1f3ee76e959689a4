import type { DerivedName } from "./result";
import type { Range } from "./targets";

/** Share of a two-sided range's width, and the one-sided margins. Starting values from general practice, from memory. */
const share = 0.05;
const pressureCmH2O = 0.5;
const phUnits = 0.01;

const oneSided: Partial<Record<DerivedName, number>> = {
  vtMlPerKg: 0,
  plateauCmH2O: pressureCmH2O,
  drivingPressureCmH2O: pressureCmH2O,
  spo2Percent: 0,
  pao2MmHg: 0,
  paco2MmHg: 0,
  ph: phUnits,
};

/**
 * S2: how wide the edge is on the inner side of a limit; 0 means only exactly on it, null that the metric has no edge.
 * The width is the ordered range's, though one side of it may not be judged just now (S5).
 */
export function edgeMargin(metric: DerivedName, ordered: Range): number | null {
  const margin = oneSided[metric];
  if (margin === undefined) return null;
  const { min, max } = ordered;
  return min !== undefined && min !== null && max !== undefined && max !== null ? share * (max - min) : margin;
}
