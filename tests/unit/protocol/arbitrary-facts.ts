import fc from "fast-check";
import {
  chartedRanges,
  modeSettings,
  ventilationModes,
  type ChartedField,
  type VentilationMode,
} from "@/lib/physiology";
import { startingSets, type Facts, type StartingSetName } from "@/lib/protocol";
import { author } from "./chart";

/** Charts as the record may hold them: any mode, any accepted number, readings missing, late and out of order. */
export const dayBegins = Date.parse("2026-12-01T00:00:00Z");
const minute = 60_000;

const charted = (field: ChartedField) => {
  const { refuse, ...rest } = chartedRanges[field] as { refuse: { min: number; max: number }; zeroAllowed?: true };
  const number = fc
    .integer({ min: Math.ceil(refuse.min * 10), max: Math.floor(refuse.max * 10) })
    .map((tenths) => tenths / 10);
  return rest.zeroAllowed
    ? fc.oneof({ weight: 9, arbitrary: number }, { weight: 1, arbitrary: fc.constant(0) })
    : number;
};
const percent = fc.integer({ min: 21, max: 100 }).map((whole) => whole / 100);
const sometimes = <Value>(arbitrary: fc.Arbitrary<Value>) => fc.option(arbitrary, { nil: null, freq: 2 });

const stamp = fc.record({
  id: fc.integer({ min: 1, max: 100_000 }).map(String),
  chartedAt: fc.integer({ min: 0, max: 24 * 60 }).map((at) => new Date(dayBegins + at * minute).toISOString()),
  recordedAt: fc.integer({ min: 0, max: 24 * 60 }).map((at) => new Date(dayBegins + at * minute).toISOString()),
  author: fc.constant(author),
});

const stamped = <Body extends object>(body: fc.Arbitrary<Body>) =>
  fc.tuple(stamp, body).map(([times, fields]) => ({ ...times, ...fields }));

const settingValue = (field: string): fc.Arbitrary<unknown> => {
  if (field === "fio2") return percent;
  if (field === "flowPattern") return fc.constantFrom("square", "decelerating");
  if (field === "triggerType") return fc.constantFrom("flow", "pressure");
  return charted(field as ChartedField);
};

function completeSettings(mode: VentilationMode): fc.Arbitrary<object> {
  const { required, oneOf, optional } = modeSettings(mode);
  const needed = [...required, ...oneOf];
  const all = Object.fromEntries([...needed, ...optional].map((field) => [field, settingValue(field)]));
  return fc.record(all, { requiredKeys: needed }).map((values) => ({ mode, ...values }));
}

const anyChange = fc.record(
  {
    peepCmH2O: charted("peepCmH2O"),
    fio2: percent,
    respiratoryRate: charted("respiratoryRate"),
    tidalVolumeMl: charted("tidalVolumeMl"),
  },
  { requiredKeys: [] },
);
const anySettings = fc.oneof(fc.constantFrom(...ventilationModes).chain(completeSettings), anyChange);

const mechanics = fc.record({
  exhaledTidalVolumeMl: sometimes(charted("exhaledTidalVolumeMl")),
  spontaneousTidalVolumeMl: sometimes(charted("spontaneousTidalVolumeMl")),
  respiratoryRateTotal: sometimes(charted("respiratoryRateTotal")),
  minuteVolumeLPerMin: sometimes(charted("minuteVolumeLPerMin")),
  peakCmH2O: sometimes(charted("peakCmH2O")),
  plateauCmH2O: sometimes(charted("plateauCmH2O")),
  totalPeepCmH2O: sometimes(charted("totalPeepCmH2O")),
  meanAirwayPressureCmH2O: sometimes(charted("meanAirwayPressureCmH2O")),
  hold: sometimes(fc.constantFrom("relaxed" as const, "effort" as const, "unsure" as const, "not-possible" as const)),
  endInspiratoryFlowZero: sometimes(fc.boolean()),
});

const therapy = fc.record({
  therapy: fc.constantFrom("neuromuscular-block", "recruitment", "ecmo", "sbt", "tube", "event"),
  on: sometimes(fc.boolean()),
  sweepLPerMin: sometimes(fc.integer({ min: 1, max: 8 })),
  unsupported: sometimes(fc.boolean()),
});

const few = <Fact extends object>(body: fc.Arbitrary<Fact>, maxLength = 6) => fc.array(stamped(body), { maxLength });

export const anyFacts = fc.record({
  settings: few(anySettings),
  settingsChecks: few(fc.constant({}), 2),
  mechanics: few(mechanics),
  observations: few(
    fc.record({
      spo2Percent: sometimes(charted("spo2Percent")),
      respiratoryRateTotal: sometimes(charted("respiratoryRateTotal")),
    }),
  ),
  bloodGases: few(
    fc.record({
      specimen: fc.constantFrom("arterial", "venous"),
      ph: sometimes(fc.integer({ min: 650, max: 800 }).map((hundredths) => hundredths / 100)),
      paco2MmHg: sometimes(charted("paco2MmHg")),
      pao2MmHg: sometimes(charted("pao2MmHg")),
      fio2: sometimes(percent),
      peepCmH2O: sometimes(charted("peepCmH2O")),
    }),
  ),
  heights: few(
    fc.record({
      heightCm: sometimes(charted("heightCm")),
      sexForPbw: sometimes(fc.constantFrom("male", "female")),
      method: fc.constantFrom("measured-lying", "ulna"),
    }),
    2,
  ),
  positions: few(fc.record({ position: sometimes(fc.constantFrom("supine", "prone", "left-lateral")) }), 3),
  therapies: few(therapy, 4),
  acknowledgements: few(
    fc.record({
      metric: fc.constantFrom("plateauCmH2O", "ph", "spo2Percent", "vtMlPerKg"),
      value: sometimes(fc.integer({ min: 5, max: 100 })),
      until: fc.integer({ min: 0, max: 24 * 60 }).map((at) => new Date(dayBegins + at * minute).toISOString()),
      note: fc.constant(""),
    }),
    3,
  ),
}) as unknown as fc.Arbitrary<Facts>;

export const anyTargets = fc
  .tuple(
    fc.constantFrom(...(Object.keys(startingSets) as StartingSetName[])),
    fc.constantFrom("order" as const, "default" as const),
    fc.option(fc.constantFrom(6, "as-needed" as const), { nil: null }),
  )
  .map(([set, origin, gasIntervalH]) => ({ set, origin, ...startingSets[set].targets, gasIntervalH }));

export const anyMoment = fc.integer({ min: 0, max: 30 * 60 }).map((at) => dayBegins + at * minute);

export const anyPauses = fc.array(fc.integer({ min: 0, max: 24 * 60 }), { maxLength: 2, minLength: 0 }).map((starts) =>
  [...starts]
    .sort((a, b) => a - b)
    .map((from, index, all) => {
      const until = Math.min(from + 45, all[index + 1] ?? Infinity);
      return { from: dayBegins + from * minute, until: dayBegins + until * minute };
    }),
);
