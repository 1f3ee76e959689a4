export type State = "inside" | "edge" | "outside" | "unmeasured" | "not-asked";
export type FreshnessWord = "current" | "due" | "lapsed" | "changed-since" | "too-soon" | "missing";
export type Group = "outside" | "unmeasured" | "edge" | "inside" | "not-judged" | "away";

export const derivedNames = [
  "vtMlPerKg",
  "plateauCmH2O",
  "drivingPressureCmH2O",
  "staticComplianceMlPerCmH2O",
  "dynamicComplianceMlPerCmH2O",
  "airwayResistanceCmH2OPerLPerS",
  "intrinsicPeepCmH2O",
  "mechanicalPowerJPerMin",
  "minuteVolumeLPerMin",
  "respiratoryRateTotal",
  "ventilatoryRatio",
  "pfRatio",
  "sfRatio",
  "spo2Percent",
  "pao2MmHg",
  "paco2MmHg",
  "ph",
  "oxygenationIndex",
  "oxygenSaturationIndex",
  "alveolarArterialGradientMmHg",
  "rapidShallowBreathingIndex",
] as const;

export type DerivedName = (typeof derivedNames)[number];

/** One input of a number: which fact it came from, when it was true, who charted it. */
export interface DerivedInput {
  name: string;
  value: number | null;
  unit: string;
  entryId: string | null;
  chartedAt: string | null;
  recordedAt: string | null;
  author: { id: string; name: string } | null;
}

export interface Limit {
  min?: number;
  max?: number;
  origin: "order" | "default";
}

/** A number with its judgement. Times are ISO 8601 in UTC. `value` is null unless it may be read as true now. */
export interface Derived {
  value: number | null;
  lastValue: number | null;
  lastState: State | null;
  unit: string;
  state: State | null;
  freshness: FreshnessWord;
  changedAt: string | null;
  changedByEntryId: string | null;
  /** What kind of change it was, for the words: a turn reads 'since the turn at 18:30'. */
  changedBy: "settings" | "turn" | "therapy" | "event" | null;
  dueAt: string | null;
  chartedAt: string | null;
  since: string | null;
  limit: Limit | null;
  band?: string;
  notes: string[];
  alternatives: { value: number | null; chartedAt: string | null; entryId: string | null; note: string }[];
  inputs: DerivedInput[];
  source: string;
}

export interface Finding {
  metric: DerivedName;
  state: State;
  value: number | null;
  lastState: State | null;
  lastValue: number | null;
  limit: Limit | null;
  distance: number | null;
  freshness: FreshnessWord;
  since: string | null;
  acknowledgement: { by: { id: string; name: string }; until: string; note: string } | null;
  /** A3: unanswered and of the kind that is sent: from when it counts, and when it is sent; null while away. */
  escalation?: { from: string; at: string | null } | null;
}

export interface NextStep {
  type: "change" | "measure" | "assess" | "call";
  field?: string;
  from?: number;
  to?: number;
  unit?: string;
  reason: string;
  arithmetic: string;
  source: string;
  cautions: string[];
  cancelledBy: string[];
  conflict?: string;
  together?: { field: string; from: number; to: number }[];
}

/** One thing that is due, or will be: the same list on every screen. */
export interface Due {
  what: "height" | "hold" | "spo2" | "gas" | "settings-check";
  dueAt: string;
  overdue: boolean;
}

/** How fresh a measured field is that has no derived number of its own (exhaled volume, total PEEP, peak …). */
export interface MeasuredFreshness {
  freshness: FreshnessWord;
  changedAt: string | null;
  changedByEntryId: string | null;
  changedBy: Derived["changedBy"];
  dueAt: string | null;
  chartedAt: string | null;
}

export interface Evaluation {
  derived: Record<DerivedName, Derived>;
  findings: Finding[];
  nextSteps: NextStep[];
  due: Due[];
  measured: Record<string, MeasuredFreshness>;
  group: Group;
  /** Why the group is what it is, worst first: `{ metric, state }` of the checks that decide it. */
  causes: { metric: DerivedName; state: State; lastState: State | null }[];
  validUntil: string | null;
  /** S4: place within the group; `compareBeds` orders by it. */
  rank?: { tier: number; steps: number; overdueSince: string | null };
}
