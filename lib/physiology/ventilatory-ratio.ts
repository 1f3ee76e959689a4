import { derivedRanges } from "./derived-ranges";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";

/** Minute volume (mL/min for each kg) and PaCO2 (mmHg, 5 kPa) that the ratio calls normal. */
const predictedMlPerKgPerMin = 100;
const predictedPaco2MmHg = 37.5;

/**
 * Ventilatory ratio: minute volume × PaCO2 over what predicted body weight would need; 1 is normal.
 * @param input.minuteVolumeLPerMin 0.1 to 60
 * @param input.paco2MmHg 8 to 250
 * @param input.pbwKg 16 to 139
 * @throws RangeError outside these
 * @source Sinha, Br J Anaesth 2009;102:692; Am J Respir Crit Care Med 2019;199:333
 * @example ventilatoryRatio({ minuteVolumeLPerMin: 7, paco2MmHg: 37.5, pbwKg: 70 }) //=> 1
 */
export function ventilatoryRatio(input: { minuteVolumeLPerMin: number; paco2MmHg: number; pbwKg: number }): number {
  const { minuteVolumeLPerMin, pbwKg } = input;
  const volumeMlPerMin =
    requireInRange("minuteVolumeLPerMin", minuteVolumeLPerMin, derivedRanges.minuteVolumeLPerMin) * 1000;
  const paco2MmHg = requireCharted("paco2MmHg", input.paco2MmHg);
  const predicted = requireInRange("pbwKg", pbwKg, derivedRanges.pbwKg) * predictedMlPerKgPerMin * predictedPaco2MmHg;
  return (volumeMlPerMin * paco2MmHg) / predicted;
}
