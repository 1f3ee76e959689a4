import { cmFromFeetInches, roundHalfUp } from "@/lib/format";
import { predictedBodyWeightKg, tidalVolumePerKg } from "@/lib/physiology";
import type { Inputs } from "../published-values";
import { asNumber, run, type MappedRun } from "./mapping";
import { sexOf } from "./sex";

/**
 * The printed card uses 2.3 kg an inch, the product the network's form in centimetres: 0.0114 kg an inch apart from
 * 60 in, so up to 1 mL on the card's rows.
 */
const cardTolerances = { pbw_kg: 0.15, vt_ml: 1 };

function cardRow(inputs: Inputs): MappedRun {
  return run(() => {
    const heightCm = cmFromFeetInches({ feet: 0, inches: asNumber(inputs.height_in) });
    const pbwKg = predictedBodyWeightKg({ sex: sexOf(inputs.sex), heightCm });
    const volumes = [4, 5, 6, 7, 8].map((mlPerKg) => [String(mlPerKg), roundHalfUp(mlPerKg * pbwKg, 0)]);
    return { pbw_kg: roundHalfUp(pbwKg, 1), vt_ml: Object.fromEntries(volumes) };
  }, cardTolerances);
}

export function mapPredictedBodyWeight(inputs: Inputs): MappedRun {
  if ("height_in" in inputs) return cardRow(inputs);
  return run(() => {
    const pbwKg = predictedBodyWeightKg({ sex: sexOf(inputs.sex), heightCm: asNumber(inputs.height_cm) });
    const volume = "target_ml_kg" in inputs && { vt_ml: roundHalfUp(asNumber(inputs.target_ml_kg) * pbwKg, 0) };
    const tidalVolumeMl = asNumber(inputs.vt_set_ml);
    const perKg = "vt_set_ml" in inputs && { ml_per_kg: tidalVolumePerKg({ tidalVolumeMl, pbwKg }) };
    return { pbw_kg: pbwKg, ...volume, ...perKg };
  });
}
