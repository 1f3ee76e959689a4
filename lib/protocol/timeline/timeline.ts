import type {
  AcknowledgementFact,
  ArdsAssessmentFact,
  BloodGasFact,
  Facts,
  HeightFact,
  MechanicsFact,
  ObservationFact,
  PositionFact,
  SettingsCheckFact,
  SettingsFact,
  TherapyFact,
} from "../facts";
import type { Change } from "./change-kinds";
import { chartedReadings } from "./charted-readings";
import { changesPerRow, type ExpiryRow } from "./expiry-rows";
import { foldSettings, type Snapshot } from "./fold-settings";
import { holdsOf, isPlateau, type Hold } from "./holds";
import { itemsInOrder, newestUntil, type Item } from "./item";
import { positionChanges, therapyChanges } from "./other-changes";
import { powerReadingsOf, type PowerReading } from "./power-readings";
import { settingChanges } from "./setting-changes";
import { volumePointsOf, type VolumePoint } from "./volume-points";

type Mechanics = Item<MechanicsFact>;
type Gas = Item<BloodGasFact>;

/** All that follows from the facts alone, ascending, made once for a facts object. */
export interface Timeline {
  snapshots: Snapshot[];
  settings: Item<SettingsFact>[];
  settingsChecks: Item<SettingsCheckFact>[];
  heights: Item<HeightFact>[];
  positions: Item<PositionFact>[];
  therapies: Item<TherapyFact>[];
  acknowledgements: Item<AcknowledgementFact>[];
  ardsAssessments: Item<ArdsAssessmentFact>[];
  changes: Record<ExpiryRow, Change[]>;
  holds: Hold[];
  /** V8: holds that charted a plateau; in APRV P-high alone. */
  plateaus: Hold[];
  volumePoints: VolumePoint[];
  /** V10: holds in A/C-VC; exhaled volumes in A/C-PC and A/C-vtPC. */
  powerReadings: PowerReading[];
  exhaled: Mechanics[];
  /** V7: exhaled volume and total rate of one reading, SIMV left out: there exhaled is the mandatory breaths' alone. */
  exhaledWithRate: Mechanics[];
  minuteVolumesOrProducts: Mechanics[];
  /** Spontaneous or exhaled volumes, for RSBI. */
  breathVolumes: Mechanics[];
  spontaneous: Mechanics[];
  minuteVolumes: Mechanics[];
  peaks: Mechanics[];
  totalPeeps: Mechanics[];
  meanPressures: Mechanics[];
  totalRates: Item<MechanicsFact | ObservationFact>[];
  spo2: Item<ObservationFact>[];
  etco2: Item<ObservationFact>[];
  /** Arterial only: a venous gas never feeds oxygen or CO2 checks. */
  gases: Gas[];
  pao2: Gas[];
  paco2: Gas[];
  ph: Gas[];
  /** Every kind's facts: what is charted ahead of `at` changes the answer when its moment comes. */
  all: (readonly { t: number }[])[];
}

function build(facts: Facts): Timeline {
  const { mechanics, observations, ...measured } = chartedReadings(facts);
  const settings = itemsInOrder(facts.settings);
  const snapshots = foldSettings(settings);
  const charted = {
    settings,
    settingsChecks: itemsInOrder(facts.settingsChecks),
    heights: itemsInOrder(facts.heights),
    positions: itemsInOrder(facts.positions),
    therapies: itemsInOrder(facts.therapies),
    acknowledgements: itemsInOrder(facts.acknowledgements),
    ardsAssessments: itemsInOrder(facts.ardsAssessments),
  };
  const changes = [
    ...settingChanges(snapshots),
    ...positionChanges(charted.positions),
    ...therapyChanges(charted.therapies),
  ].sort((a, b) => a.t - b.t);
  const isProduct = ({ t, fact }: Mechanics) =>
    typeof fact.exhaledTidalVolumeMl === "number" &&
    typeof fact.respiratoryRateTotal === "number" &&
    !newestUntil(snapshots, t)?.mode.startsWith("SIMV");
  const holds = holdsOf(mechanics, snapshots);
  return {
    ...charted,
    ...measured,
    snapshots,
    changes: changesPerRow(changes),
    exhaledWithRate: mechanics.filter(isProduct),
    minuteVolumesOrProducts: mechanics.filter(
      (item) => typeof item.fact.minuteVolumeLPerMin === "number" || isProduct(item),
    ),
    holds,
    plateaus: holds.filter(isPlateau),
    powerReadings: powerReadingsOf(holds, measured.exhaled, snapshots),
    volumePoints: volumePointsOf(snapshots, mechanics),
    all: [...Object.values(charted), mechanics, observations, measured.gases],
  };
}

const built = new WeakMap<Facts, Timeline>();

/** The timeline of a facts object, folded on first use. Facts are immutable: give a new object after a change. */
export function timelineOf(facts: Facts): Timeline {
  const known = built.get(facts);
  if (known) return known;
  const timeline = build(facts);
  built.set(facts, timeline);
  return timeline;
}
