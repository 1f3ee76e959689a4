import type { SettingField, VentilationMode } from "../physiology/modes";

/** A moment: ISO 8601 with offset, epoch milliseconds or a Date. The core normalises once and holds no clock. */
export type Instant = string | number | Date;

export interface Author {
  id: string;
  name: string;
}

/** What every charted fact carries beside its body's fields. */
export interface FactBase {
  id: string;
  chartedAt: Instant;
  recordedAt: Instant;
  author: Author;
  /** V1: a replacement at its original's `chartedAt` keeps the original's place in the order; the fact's own otherwise. */
  place?: { recordedAt: Instant; id: string } | null;
}

export type NumericSettings = Partial<Record<Exclude<SettingField, "flowPattern" | "triggerType">, number | null>>;

export interface SettingsFact extends FactBase, NumericSettings {
  mode?: VentilationMode | null;
  flowPattern?: "square" | "decelerating" | null;
  triggerType?: "flow" | "pressure" | null;
  reason?: string | null;
}

export type SettingsCheckFact = FactBase;

export type HoldQuality = "relaxed" | "effort" | "unsure" | "not-possible";

export interface MechanicsFact extends FactBase {
  exhaledTidalVolumeMl?: number | null;
  spontaneousTidalVolumeMl?: number | null;
  respiratoryRateTotal?: number | null;
  minuteVolumeLPerMin?: number | null;
  peakCmH2O?: number | null;
  plateauCmH2O?: number | null;
  hold?: HoldQuality | null;
  holdReason?: string | null;
  endInspiratoryFlowZero?: boolean | null;
  totalPeepCmH2O?: number | null;
  meanAirwayPressureCmH2O?: number | null;
  breathStacking?: boolean | null;
  pesEndInspiratoryCmH2O?: number | null;
  pesEndExpiratoryCmH2O?: number | null;
}

export interface ObservationFact extends FactBase {
  spo2Percent?: number | null;
  etco2MmHg?: number | null;
  respiratoryRateTotal?: number | null;
  heartRate?: number | null;
  systolicMmHg?: number | null;
  mapMmHg?: number | null;
}

/** `fio2` and `peepCmH2O` stand only where a person typed them; otherwise the settings then in force fill them. */
export interface BloodGasFact extends FactBase {
  specimen: "arterial" | "venous";
  ph?: number | null;
  paco2MmHg?: number | null;
  pao2MmHg?: number | null;
  hco3MmolPerL?: number | null;
  sao2Percent?: number | null;
  lactateMmolPerL?: number | null;
  fio2?: number | null;
  peepCmH2O?: number | null;
}

export type HeightMethod =
  "measured-standing" | "measured-lying" | "document" | "ulna" | "knee-height" | "demispan" | "reported";

/** Estimated heights arrive already worked out in `heightCm`. */
export interface HeightFact extends FactBase {
  heightCm?: number | null;
  sexForPbw?: "male" | "female" | null;
  method: HeightMethod;
  reason?: string | null;
}

export interface WeightFact extends FactBase {
  weightKg: number;
}

export interface PositionFact extends FactBase {
  position?: "supine" | "prone" | "left-lateral" | "right-lateral" | null;
  headOfBedDegrees?: number | null;
}

/** `therapy: 'event'` names what expires pressures; the others carry their own state fields. */
export interface TherapyFact extends FactBase {
  therapy: "neuromuscular-block" | "recruitment" | "ecmo" | "sbt" | "tube" | "event";
  on?: boolean | null;
  sweepLPerMin?: number | null;
  bloodFlowLPerMin?: number | null;
  event?: "disconnection" | "bronchoscopy" | "chest-drain" | null;
  method?: string | null;
  outcome?: string | null;
  minutes?: number | null;
  /** SBT without pressure support: the only one that RSBI is asked of. */
  unsupported?: boolean | null;
}

export interface ConditionFact extends FactBase {
  airLeak?: "yes" | "no" | "unknown" | null;
  rightHeartFailure?: "yes" | "no" | "unknown" | null;
  unstableSpine?: "yes" | "no" | "unknown" | null;
  openChestOrAbdomen?: "yes" | "no" | "unknown" | null;
  raisedIntracranialPressure?: "yes" | "no" | "unknown" | null;
  facialOrPelvicFracture?: "yes" | "no" | "unknown" | null;
}

export interface AcknowledgementFact extends FactBase {
  metric: string;
  value: number | null;
  until: Instant;
  note: string;
}

export interface ArdsAssessmentFact extends FactBase {
  ards: boolean;
}

/** Everything charted that the core judges, ascending by (chartedAt, recordedAt, id), standing entries only. */
export interface Facts {
  settings?: readonly SettingsFact[];
  settingsChecks?: readonly SettingsCheckFact[];
  mechanics?: readonly MechanicsFact[];
  observations?: readonly ObservationFact[];
  bloodGases?: readonly BloodGasFact[];
  heights?: readonly HeightFact[];
  weights?: readonly WeightFact[];
  positions?: readonly PositionFact[];
  therapies?: readonly TherapyFact[];
  conditions?: readonly ConditionFact[];
  acknowledgements?: readonly AcknowledgementFact[];
  ardsAssessments?: readonly ArdsAssessmentFact[];
}
