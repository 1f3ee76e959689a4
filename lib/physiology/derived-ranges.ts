/**
 * Allowed ranges of arguments that are themselves worked out, or are no charted field. Bounds inclusive; unless a
 * source is named, they are what the charted ranges of the inputs can give.
 */
export const derivedRanges = {
  /** The line of predicted body weight between 120 and 250 cm. */
  pbwKg: { min: 16, max: 139 },
  /** Adults. Common practice. */
  ageYears: { min: 16, max: 120 },
  /** Of one breath or more: set and total rates alike. */
  respiratoryRate: { min: 1, max: 150 },
  /** Below 0.1 L/min nobody is ventilated: millilitres were divided by 1,000 twice. Common practice. */
  minuteVolumeLPerMin: { min: 0.1, max: 60 },
  pfRatio: { min: 10, max: 3334 },
  sfRatio: { min: 30, max: 477 },
  complianceMlPerCmH2O: { min: 0.1, max: 2000 },
  /** From about 5,000 m of altitude to below sea level. Common practice. */
  barometricPressureMmHg: { min: 400, max: 800 },
  /** From starvation to overfeeding. Common practice. */
  respiratoryQuotient: { min: 0.6, max: 1.3 },
  deadSpaceMl: { min: 0, max: 2000 },
  mixedExpiredCo2MmHg: { min: 0, max: 250 },
  chestQuadrants: { min: 0, max: 4 },
} as const;
