/**
 * Refuse ranges (impossible, or a slipped unit) and ask ranges (unusual: one extra tap) of every charted number, bounds
 * inclusive. Common practice, no published source. Units stand in the names; FiO2 is a fraction.
 * The zod contracts and the database's CHECK constraints repeat `refuse`.
 */
export interface ChartedRange {
  refuse: { min: number; max: number };
  ask: { min: number; max: number };
  /** Below the refuse minimum and still charted: an exhaled volume of exactly 0 (disconnected, or no breath). */
  zeroAllowed?: true;
  /** Digits after the decimal point a person may chart. */
  decimals: number;
}

const range = (refuse: [number, number], ask: [number, number], decimals = 4): ChartedRange => ({
  refuse: { min: refuse[0], max: refuse[1] },
  ask: { min: ask[0], max: ask[1] },
  decimals,
});

export const chartedRanges = {
  fio2: range([0.21, 1], [0.21, 1]),
  tidalVolumeMl: range([20, 2000], [150, 1000]),
  exhaledTidalVolumeMl: { ...range([10, 2000], [150, 1000]), zeroAllowed: true },
  spontaneousTidalVolumeMl: { ...range([10, 2000], [150, 1000]), zeroAllowed: true },
  tidalVolumeMlPerKg: range([0, 25], [4, 8]),
  respiratoryRate: range([1, 120], [6, 35]),
  respiratoryRateTotal: range([0, 150], [6, 40]),
  peepCmH2O: range([0, 50], [0, 24]),
  totalPeepCmH2O: range([0, 60], [0, 26]),
  peakCmH2O: range([2, 120], [8, 40]),
  plateauCmH2O: range([2, 100], [5, 30]),
  meanAirwayPressureCmH2O: range([0, 80], [4, 30]),
  flowLPerMin: range([5, 200], [30, 100]),
  hfnoFlowLPerMin: range([1, 80], [20, 60]),
  minuteVolumeLPerMin: range([0, 60], [3, 20]),
  pressureSupportCmH2O: range([0, 60], [0, 25]),
  pressureAbovePeepCmH2O: range([1, 80], [5, 30]),
  pHighCmH2O: range([5, 60], [15, 30]),
  pLowCmH2O: range([0, 40], [0, 10]),
  tHighS: range([0.2, 30], [2, 10]),
  tLowS: range([0.1, 5], [0.2, 1.5]),
  frequencyHz: range([3, 20], [4, 12]),
  amplitudeCmH2O: range([5, 150], [40, 100]),
  triggerLPerMin: range([0.1, 20], [1, 6]),
  triggerCmH2O: range([0.1, 20], [0.5, 3]),
  inspiratoryTimeS: range([0.1, 10], [0.5, 2]),
  inspiratoryToExpiratory: range([0.05, 10], [0.2, 1]),
  pesEndInspiratoryCmH2O: range([-40, 60], [-10, 30]),
  pesEndExpiratoryCmH2O: range([-40, 60], [-10, 30]),
  cuffCmH2O: range([0, 120], [20, 30]),
  pao2MmHg: range([10, 700], [55, 300]),
  paco2MmHg: range([8, 250], [25, 80]),
  ph: range([6.5, 8], [7.15, 7.6], 3),
  hco3MmolPerL: range([1, 80], [12, 40]),
  sao2Percent: range([10, 100], [85, 100]),
  lactateMmolPerL: range([0, 40], [0.3, 4]),
  spo2Percent: range([30, 100], [88, 100]),
  etco2MmHg: range([0, 150], [20, 70]),
  heartRate: range([0, 300], [40, 140]),
  systolicMmHg: range([0, 350], [90, 180]),
  mapMmHg: range([0, 250], [60, 110]),
  cvpMmHg: range([-10, 60], [0, 18]),
  paopMmHg: range([-10, 60], [5, 18]),
  urineMlPerKgPerH: range([0, 50], [0.5, 5]),
  heightCm: range([100, 250], [147.3, 213.4]),
  ulnaCm: range([18.5, 32], [21, 30]),
  demispanCm: range([50, 120], [65, 95]),
  kneeHeightCm: range([30, 75], [40, 62]),
  weightKg: range([20, 400], [40, 180]),
  temperatureC: range([15, 45], [35, 40]),
  headOfBedDegrees: range([-30, 90], [30, 45]),
} as const satisfies Record<string, ChartedRange>;

export type ChartedField = keyof typeof chartedRanges;

/** Predicted body weight is computed from this height on (cm); shorter adults are ordered in millilitres. */
export const pbwHeightCm = { min: 120, max: 250, extrapolatedBelow: 152.4 } as const;

/** Is the value outside the refuse range? Bounds belong to the range; exactly 0 is charted where `zeroAllowed`. */
export function isRefused(field: ChartedField, value: number): boolean {
  const { refuse, ...rest }: ChartedRange = chartedRanges[field];
  if (rest.zeroAllowed && value === 0) return false;
  return !(Number.isFinite(value) && value >= refuse.min && value <= refuse.max);
}

/** Is an accepted value outside the ask range, so that a person confirms it with one extra tap? */
export function isUnusual(field: ChartedField, value: number): boolean {
  const { ask } = chartedRanges[field];
  return !isRefused(field, value) && (value < ask.min || value > ask.max);
}
