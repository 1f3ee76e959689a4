import { pbwHeightCm } from "../physiology/limits";
import { predictedBodyWeightKg } from "../physiology/predicted-body-weight-kg";
import type { Facts, HeightFact, Instant } from "./facts";
import { millisecondsOf } from "./instant";
import { countUntil, type Item } from "./timeline/item";
import { timelineOf } from "./timeline/timeline";

/** V12: predicted body weight with how it was come by. */
export interface Pbw {
  pbwKg: number | null;
  /** Both answers where the height is known and the sex used for PBW is not. */
  alternatives: { male: number; female: number } | null;
  heightCm: number | null;
  sex: "male" | "female" | null;
  method: HeightFact["method"] | null;
  /** Below 152.4 cm. */
  extrapolated: boolean;
  /** Charted, and too short for a PBW: volume is ordered in millilitres. */
  tooShort: boolean;
  height: Item<HeightFact> | null;
}

function newestWith(heights: readonly Item<HeightFact>[], field: "heightCm" | "sexForPbw", at: number) {
  for (let index = countUntil(heights, at) - 1; index >= 0; index--) {
    const item = heights[index]!;
    if (item.fact[field] !== null && item.fact[field] !== undefined) return item;
  }
  return null;
}

function weights(heightCm: number, sex: Pbw["sex"]): Pick<Pbw, "pbwKg" | "alternatives"> {
  if (sex !== null) return { pbwKg: predictedBodyWeightKg({ sex, heightCm }), alternatives: null };
  const male = predictedBodyWeightKg({ sex: "male", heightCm });
  const female = predictedBodyWeightKg({ sex: "female", heightCm });
  return { pbwKg: null, alternatives: { male, female } };
}

/**
 * V12: PBW in force, from the newest height and the newest sex used for PBW. Without a sex both weights stand side by
 * side; without a height, or below 120 cm, there is none.
 */
export function pbwOf(facts: Facts, at: Instant): Pbw {
  const { heights } = timelineOf(facts);
  const moment = millisecondsOf(at);
  const height = newestWith(heights, "heightCm", moment);
  const heightCm = height?.fact.heightCm ?? null;
  const sex = newestWith(heights, "sexForPbw", moment)?.fact.sexForPbw ?? null;
  const usable = heightCm !== null && heightCm >= pbwHeightCm.min && heightCm <= pbwHeightCm.max;
  return {
    ...(usable ? weights(heightCm, sex) : { pbwKg: null, alternatives: null }),
    heightCm,
    sex,
    method: height?.fact.method ?? null,
    extrapolated: usable && heightCm < pbwHeightCm.extrapolatedBelow,
    tooShort: heightCm !== null && heightCm < pbwHeightCm.min,
    height,
  };
}
