import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { catalogue, type Entry } from "./catalogue";

const sexes = fc.constantFrom("male", "female");

/** Any accepted value of an argument; FiO2 in whole percent. */
function accepted(field: string, [min, max]: readonly [number, number]): fc.Arbitrary<number> {
  if (field === "fio2") return fc.integer({ min: 21, max: 100 }).map((percent) => percent / 100);
  return fc.double({ min, max, noNaN: true });
}

function refused([min, max]: readonly [number, number]): fc.Arbitrary<unknown> {
  // -0 is generated as less than 0, but is 0.
  const below = fc.double({ max: min, maxExcluded: true, noNaN: true }).filter((value) => value < min);
  return fc.oneof(
    below,
    fc.double({ min: max, minExcluded: true, noNaN: true }),
    fc.constantFrom(NaN, Infinity, -Infinity),
    fc.string(),
  );
}

function inputsOf({ ranges, example }: Entry): fc.Arbitrary<Record<string, unknown>> {
  const fields = Object.entries(ranges).map(([field, range]) => [field, accepted(field, range)] as const);
  return fc.record({ ...Object.fromEntries(fields), ...("sex" in example && { sex: sexes }) });
}

/** The answer, or null where the function refuses a combination that cannot be. Any other error fails the test. */
function answerOrRefusal({ call }: Entry, input: Record<string, unknown>): number | null {
  try {
    return call(input);
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}

/** Arguments of which every combination inside the ranges can be; the others have a test of their combination below. */
const anyCombination = catalogue.filter(({ name }) =>
  [
    "predictedBodyWeightKg",
    "heightFromUlnaCm",
    "heightFromDemispanCm",
    "heightFromKneeHeightCm",
    "tidalVolumePerKg",
    "exhaledVolumePerKg",
    "minuteVolumeLPerMin",
    "mechanicalPowerPressureControlJPerMin",
    "ventilatoryRatio",
    "predictedPh",
    "pfRatio",
    "sfRatio",
    "altitudeAdjustedPf",
    "oxygenationIndex",
    "oxygenSaturationIndex",
    "rapidShallowBreathingIndex",
    "roxIndex",
  ].includes(name),
);

describe("properties of every function", () => {
  test.each(catalogue)("$name answers accepted inputs with a finite number or RangeError, never NaN", (entry) => {
    fc.assert(
      fc.property(inputsOf(entry), (input) => {
        const answer = answerOrRefusal(entry, input);
        expect(answer === null || Number.isFinite(answer)).toBe(true);
      }),
    );
  });

  test("the functions whose every combination can be are seventeen", () => {
    expect(anyCombination).toHaveLength(17);
  });

  test.each(anyCombination)("$name never refuses inputs inside their ranges", (entry) => {
    fc.assert(
      fc.property(inputsOf(entry), (input) => {
        expect(entry.call(input)).toBeTypeOf("number");
      }),
    );
  });

  test.each(catalogue)("$name refuses any one argument outside its range, whatever the others", (entry) => {
    const oneOutside = fc
      .constantFrom(...Object.entries(entry.ranges))
      .chain(([field, range]) => fc.tuple(fc.constant(field), inputsOf(entry), refused(range)));
    fc.assert(
      fc.property(oneOutside, ([field, input, value]) => {
        // Exactly 0 is charted for an exhaled volume: no breath.
        fc.pre(!(field === "exhaledTidalVolumeMl" && value === 0));
        expect(() => entry.call({ ...input, [field]: value })).toThrow(RangeError);
      }),
    );
  });
});

type Direction = "rises" | "falls";

const monotone: readonly [name: string, field: string, direction: Direction][] = [
  ["predictedBodyWeightKg", "heightCm", "rises"],
  ["heightFromUlnaCm", "ulnaCm", "rises"],
  ["heightFromDemispanCm", "demispanCm", "rises"],
  ["heightFromKneeHeightCm", "kneeHeightCm", "rises"],
  ["heightFromKneeHeightCm", "ageYears", "falls"],
  ["tidalVolumePerKg", "tidalVolumeMl", "rises"],
  ["tidalVolumePerKg", "pbwKg", "falls"],
  ["minuteVolumeLPerMin", "respiratoryRate", "rises"],
  ["expiratoryTimeS", "respiratoryRate", "falls"],
  ["expiratoryTimeS", "inspiratoryTimeS", "falls"],
  ["drivingPressureCmH2O", "plateauCmH2O", "rises"],
  ["drivingPressureCmH2O", "totalPeepCmH2O", "falls"],
  ["staticComplianceMlPerCmH2O", "tidalVolumeMl", "rises"],
  ["staticComplianceMlPerCmH2O", "plateauCmH2O", "falls"],
  ["dynamicComplianceMlPerCmH2O", "peakCmH2O", "falls"],
  ["airwayResistanceCmH2OPerLPerS", "peakCmH2O", "rises"],
  ["airwayResistanceCmH2OPerLPerS", "flowLPerMin", "falls"],
  ["intrinsicPeepCmH2O", "totalPeepCmH2O", "rises"],
  ["mechanicalPowerVolumeControlJPerMin", "respiratoryRate", "rises"],
  ["mechanicalPowerVolumeControlJPerMin", "peakCmH2O", "rises"],
  ["mechanicalPowerVolumeControlJPerMin", "plateauCmH2O", "falls"],
  ["mechanicalPowerPressureControlJPerMin", "peepCmH2O", "rises"],
  ["ventilatoryRatio", "paco2MmHg", "rises"],
  ["ventilatoryRatio", "pbwKg", "falls"],
  ["deadSpaceFractionEnghoff", "mixedExpiredCo2MmHg", "falls"],
  ["predictedPaco2MmHg", "toRespiratoryRate", "falls"],
  ["predictedPaco2MmHg", "toTidalVolumeMl", "falls"],
  ["predictedPh", "paco2MmHg", "falls"],
  ["predictedPh", "hco3MmolPerL", "rises"],
  ["pfRatio", "pao2MmHg", "rises"],
  ["pfRatio", "fio2", "falls"],
  ["sfRatio", "fio2", "falls"],
  ["altitudeAdjustedPf", "barometricPressureMmHg", "falls"],
  ["oxygenationIndex", "meanAirwayPressureCmH2O", "rises"],
  ["oxygenationIndex", "pao2MmHg", "falls"],
  ["oxygenSaturationIndex", "spo2Percent", "falls"],
  ["alveolarPo2MmHg", "fio2", "rises"],
  ["alveolarPo2MmHg", "paco2MmHg", "falls"],
  ["alveolarArterialGradientMmHg", "pao2MmHg", "falls"],
  ["rapidShallowBreathingIndex", "respiratoryRate", "rises"],
  ["roxIndex", "respiratoryRate", "falls"],
];

function entryOf(name: string): Entry {
  const found = catalogue.find((entry) => entry.name === name);
  if (!found) throw new Error(`no entry for ${name}`);
  return found;
}

describe("direction", () => {
  test.each(monotone)("%s: with more %s it %s, or stays", (name, field, direction) => {
    const entry = entryOf(name);
    const range = entry.ranges[field];
    if (!range) throw new Error(`${name} takes no ${field}`);
    let compared = 0;
    fc.assert(
      fc.property(inputsOf(entry), accepted(field, range), accepted(field, range), (input, one, other) => {
        const lower = answerOrRefusal(entry, { ...input, [field]: Math.min(one, other) });
        const higher = answerOrRefusal(entry, { ...input, [field]: Math.max(one, other) });
        if (lower === null || higher === null) return;
        compared += 1;
        const rise = higher - lower;
        const noise = 1e-9 * Math.max(1, Math.abs(lower), Math.abs(higher));
        expect(direction === "rises" ? rise : -rise).toBeGreaterThanOrEqual(-noise);
      }),
    );
    expect(compared).toBeGreaterThan(0);
  });
});
