import type { UnitIntervals, UnitPolicy, UnitSteps } from "./targets";

/** A unit's policy with nothing left out. */
export interface Policy {
  barometricPressureMmHg: number;
  intervals: UnitIntervals;
  steps: UnitSteps;
}

/** F2, F3, F5, V5: starting values from general practice, from memory; minutes. Each unit may set its own. */
export const unitPolicyDefaults: Policy = {
  barometricPressureMmHg: 760,
  intervals: {
    pressuresMin: 240,
    exhaledVolumeMin: 240,
    totalRateMin: 240,
    spo2Min: 60,
    gasMin: 720,
    firstGasMin: 60,
    settingsCheckMin: 240,
    heightMin: 60,
    holdAfterChangeMin: 30,
    holdAfterEffortMin: 30,
    spo2AfterChangeMin: 10,
    gasTooSoonMin: 20,
    gasAfterTurnMin: 60,
    gasAfterVolumeCutMin: 30,
  },
  steps: { tidalVolumeMl: 10 },
};

/** V13: at or below this barometric pressure (mmHg, 1,000 m) the band and proning compare an adjusted P/F. */
export const altitudeFromMmHg = 674;

/** S8: trapped gas up to this is inside (cmH2O). Starting value, from memory. */
export const trappedGasMaxCmH2O = 10;

/** S5: upper oxygen limits are judged only above this FiO2 (percent); with condition COPD above room air. From memory. */
export const fio2PercentJudgedAbove = { usual: 40, copd: 21 } as const;

/** V5: a mean airway pressure or minute volume belongs to a gas within this time. From memory. */
export const pairedWithinMin = 60;

/** S3: how much older than SpO2 a PaO2 may be, and how old it may be in its place. From memory. */
export const pao2BesideSpo2Min = 60;
export const pao2InPlaceOfSpo2Min = 120;

/** A3: unanswered this long, a finding is sent. From memory. */
export const escalateAfterMin = 30;

const filled = new WeakMap<object, Policy>();

/** The policy with what it leaves out filled from the defaults. */
export function policyOf(unit: UnitPolicy | null | undefined): Policy {
  if (!unit) return unitPolicyDefaults;
  const known = filled.get(unit);
  if (known) return known;
  const policy: Policy = {
    barometricPressureMmHg: unit.barometricPressureMmHg ?? unitPolicyDefaults.barometricPressureMmHg,
    intervals: { ...unitPolicyDefaults.intervals, ...unit.intervals },
    steps: { ...unitPolicyDefaults.steps, ...unit.steps },
  };
  filled.set(unit, policy);
  return policy;
}
