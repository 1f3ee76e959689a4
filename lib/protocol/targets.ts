import type { Instant } from "./facts";

export interface Range {
  min?: number;
  max?: number;
}

export type TargetCondition =
  | "ards"
  | "obstructive"
  | "copd"
  | "raised-icp"
  | "after-cardiac-arrest"
  | "pregnancy"
  | "ecmo"
  | "one-lung"
  | "comfort";

/** A target order, or the unit's default where nobody has ordered one. Pressures cmH2O, gases mmHg, volumes mL. */
export interface Targets {
  set?: string;
  recordedAt?: Instant;
  origin: "order" | "default";
  conditions: readonly TargetCondition[];
  vtMlPerKg?: { min?: number; max?: number; goal?: number | Range | null } | null;
  vtMl?: { min?: number; max?: number; goal?: number | Range | null } | null;
  plateauCmH2O?: Range | null;
  drivingPressureCmH2O?: Range | null;
  spo2Percent?: Range | null;
  pao2MmHg?: Range | null;
  ph?: Range | null;
  paco2MmHg?: Range | null;
  respiratoryRate?: Range | null;
  peepTable?: "lower" | "higher" | "none";
  mechanicalPowerJPerMin?: Range | null;
  gasIntervalH?: number | "as-needed" | null;
  /** O1, S8: the order asks for a measured total PEEP. */
  totalPeepRequired?: boolean;
  /** 1:3 or longer is 1/3. */
  longestInspiratoryToExpiratory?: number;
  /** Pregnancy: a PaCO2 above this is a *call*. */
  callAbovePaco2MmHg?: number;
  proningOnlyAsCall?: boolean;
}

/**
 * What a unit may set, versioned. All of it may be left out: `unitPolicyDefaults` fills the rest with starting values
 * from general practice.
 */
export interface UnitPolicy {
  barometricPressureMmHg?: number;
  timeZone?: string;
  intervals?: Partial<UnitIntervals>;
  steps?: Partial<UnitSteps>;
  nextStepsEnabled?: boolean;
}

/** How long a result serves, in minutes. */
export interface UnitIntervals {
  pressuresMin: number;
  exhaledVolumeMin: number;
  totalRateMin: number;
  spo2Min: number;
  gasMin: number;
  firstGasMin: number;
  settingsCheckMin: number;
  heightMin: number;
  holdAfterChangeMin: number;
  holdAfterEffortMin: number;
  spo2AfterChangeMin: number;
  gasTooSoonMin: number;
  gasAfterTurnMin: number;
  gasAfterVolumeCutMin: number;
}

/** The ventilator's own steps. */
export interface UnitSteps {
  tidalVolumeMl: number;
}

export interface Pause {
  from: Instant;
  until?: Instant | null;
}

export interface EpisodeFacts {
  intubatedAt: Instant;
  pauses?: readonly Pause[];
  endedAt?: Instant | null;
}
