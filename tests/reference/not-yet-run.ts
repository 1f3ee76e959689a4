import type { PublishedValue } from "./published-values";

/** Published values wait by item and by the rule they test; `keys` where only these expectations of it wait. */
interface Waiting {
  /** The function that would answer them; the suite fails when it exists and these are still not run. */
  missing: string;
  item: string;
  /** The source's name of the calculation, rule, scale, field or list; absent where the item's rows name none. */
  rule?: string;
  keys?: readonly string[];
}

const waitingForWord: readonly [item: string, missing: string, rules: readonly (string | undefined)[]][] = [
  ["02-height-surrogate", "heightFromDemispanBasseyCm", ["demispan-bassey"]],
  ["03-pf-ards", "americanEuropeanConsensusLabel", ["aecc-historic"]],
  ["04-mechanics", "normalisedElastance", ["normalised-elastance"]],
  ["04-mechanics", "transpulmonaryPressures", ["transpulmonary-direct", "transpulmonary-elastance"]],
  ["04-mechanics", "stressIndexMeaning", ["stress-index"]],
  ["04-mechanics", "pressureControlDrivingPressure", ["pcv-dp-caveat"]],
  ["05-mech-power", "mechanicalPowerFullJPerMin", ["vcv-full"]],
  ["05-mech-power", "mechanicalPowerWithoutHoldJPerMin", ["vcv-surrogate-no-hold"]],
  ["05-mech-power", "mechanicalPowerRiseTimeJPerMin", ["pcv-slope"]],
  ["05-mech-power", "mechanicalPowerFlag", ["flag-17"]],
  ["06-ventilation", "correctedMinuteVolumeLPerMin", ["corrected-minute-ventilation"]],
  ["06-ventilation", "restingEnergyKcalPerDay", ["harris-benedict", "weir"]],
  ["06-ventilation", "deadSpaceFractionEstimated", ["vdvt-estimated"]],
  ["07-oxygenation", "alveolarPo2FullMmHg", ["alveolar-gas-full"]],
  ["07-oxygenation", "expectedGradientMmHg", ["expected-Aa-room-air"]],
  ["07-oxygenation", "pfFromSf", ["pf-from-sf-linear", "pf-from-sf-nonlinear"]],
  ["08-ardsnet", "tidalVolumeStep", ["plateau"]],
  ["08-ardsnet", "acidBaseStep", ["pH"]],
  ["08-ardsnet", "oxygenationGoal", ["oxygenation-goal"]],
  ["08-ardsnet", "peepTableStep", ["table-low-peep-high-fio2", "table-high-peep-low-fio2"]],
  ["08-ardsnet", "peepOptions", ["peep-for-fio2", "on-table"]],
  ["08-ardsnet", "tidalVolumeStartSchedule", ["vt-start-schedule"]],
  ["08-ardsnet", "initialRespiratoryRate", ["rr-initial"]],
  ["08-ardsnet", "sbtEligibility", ["sbt-eligible"]],
  ["08-ardsnet", "sbtFailureSigns", ["sbt-failure-ers2007"]],
  ["08-ardsnet", "cuffLeak", ["cuff-leak"]],
  ["09-rescue", "proneEligibility", ["prone-inclusion"]],
  ["09-rescue", "proneSessionMet", ["prone-session"]],
  ["09-rescue", "proneStop", ["prone-stop"]],
  ["09-rescue", "neuromuscularBlockTrialEntry", ["nmb-trial-entry"]],
  ["09-rescue", "ecmoReferral", ["eolia"]],
  ["09-rescue", "recruitmentToInflationRatio", ["r-i-ratio"]],
  ["09-rescue", "oscillationStart", ["hfov-oscar-start"]],
  ["09-rescue", "releaseVentilationTiming", ["aprv"]],
  ["10-fluids", "fluidStep", ["factt-lite", "fluid-bolus", "furosemide-doubling", "furosemide-withhold"]],
  ["11-vac", "ventilatorAssociatedConditions", [undefined, "aprv-day"]],
  ["11-vac", "dailyMinimum", ["daily-minimum"]],
  ["11-vac", "infectionRelatedCondition", ["ivac"]],
  ["12-bundle", "careChecks", ["FAST HUG"]],
  ["12-bundle", "rassLabel", ["RASS"]],
  ["12-bundle", "painScale", ["CPOT", "BPS"]],
  ["12-bundle", "careCheckInTarget", ["hob_deg", "cuff_cmH2O"]],
  ["12-bundle", "confusionAssessment", ["CAM-ICU"]],
  ["13-units", "loincCheckDigit", ["loinc_check_digit"]],
  ["15-guideline-claims", "guidelineClaims", ["claim"]],
];

const waitingInPart: readonly Waiting[] = [
  // The printed footnote adjusts in the wrong direction: the product has no function for it on purpose.
  {
    item: "03-pf-ards",
    rule: "berlin-altitude-as-printed",
    missing: "altitudeAdjustedPfAsPrinted",
    keys: ["pf_corrected", "band_corrected"],
  },
  { item: "07-oxygenation", rule: "ROX", missing: "roxBand", keys: ["band"] },
];

const waiting: readonly Waiting[] = [
  ...waitingForWord.flatMap(([item, missing, rules]) => rules.map((rule) => ({ item, missing, rule }))),
  ...waitingInPart,
];

export const missingFunctions = [...new Set(waiting.map(({ missing }) => missing))];

function ruleOf({ inputs }: PublishedValue): string | undefined {
  const named = inputs.calc ?? inputs.rule ?? inputs.scale ?? inputs.field ?? inputs.list ?? inputs.method;
  if (named !== undefined) return String(named);
  return ["loinc_check_digit", "claim"].find((key) => key in inputs);
}

/** The function a published value waits for, and which of its expectations; null where none of it waits. */
export function waitsFor(value: PublishedValue): { missing: string; keys: readonly string[] } | null {
  const rule = ruleOf(value);
  const found = waiting.find((each) => each.item === value.item && each.rule === rule);
  return found ? { missing: found.missing, keys: found.keys ?? Object.keys(value.expected) } : null;
}
