import type { JudgedMetrics } from "./findings/checks";
import { notAsked } from "./judge/judged";
import { judgeAlveolarArterialGradient } from "./metrics/alveolar-arterial-gradient";
import { judgeDrivingPressure } from "./metrics/driving-pressure";
import { judgeDynamicCompliance } from "./metrics/dynamic-compliance";
import { judgePaco2, judgePao2, judgePh } from "./metrics/gas-values";
import { judgeMinuteVolume } from "./metrics/minute-volume";
import { judgeOxygenSaturationIndex } from "./metrics/oxygen-saturation-index";
import { judgeOxygenationIndex } from "./metrics/oxygenation-index";
import { judgePfRatio } from "./metrics/pf-ratio";
import { judgePlateau } from "./metrics/plateau";
import { judgePower } from "./metrics/power";
import { judgeRapidShallowBreathingIndex } from "./metrics/rapid-shallow-breathing-index";
import { judgeResistance } from "./metrics/resistance";
import { judgeSfRatio } from "./metrics/sf-ratio";
import { judgeSpo2 } from "./metrics/spo2";
import { judgeStaticCompliance } from "./metrics/static-compliance";
import { judgeTotalRate } from "./metrics/total-rate";
import { judgeTrappedGas } from "./metrics/trapped-gas";
import { judgeVentilatoryRatio } from "./metrics/ventilatory-ratio";
import { judgeVolume } from "./metrics/volume";
import type { DerivedName } from "./result";
import type { Scene } from "./scene";

const judges = {
  vtMlPerKg: judgeVolume,
  plateauCmH2O: judgePlateau,
  drivingPressureCmH2O: judgeDrivingPressure,
  staticComplianceMlPerCmH2O: judgeStaticCompliance,
  dynamicComplianceMlPerCmH2O: judgeDynamicCompliance,
  airwayResistanceCmH2OPerLPerS: judgeResistance,
  intrinsicPeepCmH2O: judgeTrappedGas,
  mechanicalPowerJPerMin: judgePower,
  minuteVolumeLPerMin: judgeMinuteVolume,
  respiratoryRateTotal: judgeTotalRate,
  ventilatoryRatio: judgeVentilatoryRatio,
  pfRatio: judgePfRatio,
  sfRatio: judgeSfRatio,
  spo2Percent: judgeSpo2,
  pao2MmHg: judgePao2,
  paco2MmHg: judgePaco2,
  ph: judgePh,
  oxygenationIndex: judgeOxygenationIndex,
  oxygenSaturationIndex: judgeOxygenSaturationIndex,
  alveolarArterialGradientMmHg: judgeAlveolarArterialGradient,
  rapidShallowBreathingIndex: judgeRapidShallowBreathingIndex,
} as const;

/** Every metric judged at the scene's moment. O3: under *comfort* numbers stand, and nothing ordered is judged. */
export function judgeAll(scene: Scene): JudgedMetrics {
  const metrics = {} as JudgedMetrics;
  for (const name of Object.keys(judges) as DerivedName[]) {
    const judged = judges[name](scene);
    metrics[name] = scene.comfort && judged.limit ? notAsked(judged) : judged;
  }
  return metrics;
}
