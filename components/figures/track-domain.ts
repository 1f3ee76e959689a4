/** Fixed ends of each range track, so that the same place means the same value in every row and on every day. */
export const trackDomains = {
  /** mL/kg PBW */
  vtMlPerKg: [3, 10],
  /** cmH2O */
  plateauCmH2O: [15, 40],
  /** cmH2O */
  drivingPressureCmH2O: [5, 25],
  /** mmHg */
  pao2MmHg: [40, 110],
  /** % */
  spo2Percent: [85, 100],
  /** mmHg */
  paco2MmHg: [25, 80],
  ph: [7.1, 7.6],
  /** Richmond scale, points */
  rass: [-5, 4],
  /** cmH2O */
  intrinsicPeepCmH2O: [0, 15],
} as const satisfies Record<string, readonly [number, number]>;

export type TrackMetric = keyof typeof trackDomains;
