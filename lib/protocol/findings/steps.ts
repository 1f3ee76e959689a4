import type { DerivedName } from "../result";

/** A2, S4: one step further out. Starting values, from memory. */
const steps: Partial<Record<DerivedName, number>> = {
  vtMlPerKg: 0.5,
  plateauCmH2O: 2,
  drivingPressureCmH2O: 2,
  intrinsicPeepCmH2O: 2,
  spo2Percent: 2,
  pao2MmHg: 5,
  paco2MmHg: 5,
  ph: 0.03,
};

/** By an order in millilitres, 0.5 mL/kg of a person of 60 kg. */
const volumeStepMl = 30;

/** The metric's step, in its unit. */
export function stepOf(metric: DerivedName, unit: string): number {
  return unit === "mL" ? volumeStepMl : (steps[metric] ?? 1);
}
