import { derivedRanges } from "./derived-ranges";
import { requireAbove } from "./require-above";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";

interface Breathing {
  tidalVolumeMl: number;
  respiratoryRate: number;
  deadSpaceMl: number;
}

function alveolarMlPerMin(prefix: "from" | "to", { tidalVolumeMl, respiratoryRate, deadSpaceMl }: Breathing): number {
  const volumeName = `${prefix}TidalVolumeMl`;
  requireCharted("tidalVolumeMl", tidalVolumeMl, volumeName);
  requireInRange(`${prefix}RespiratoryRate`, respiratoryRate, derivedRanges.respiratoryRate);
  requireAbove({ name: volumeName, value: tidalVolumeMl }, { name: "deadSpaceMl", value: deadSpaceMl });
  return respiratoryRate * (tidalVolumeMl - deadSpaceMl);
}

/**
 * Estimated PaCO2 (mmHg) after a change of volume or rate: PaCO2 × alveolar ventilation before / after. An estimate
 * for a steady state, 20 to 30 min later, with CO2 production, perfusion and dead space (mL) unchanged.
 * @param input.paco2MmHg 8 to 250
 * @param input.fromTidalVolumeMl 20 to 2000, above dead space; `toTidalVolumeMl` alike
 * @param input.fromRespiratoryRate 1 to 150; `toRespiratoryRate` alike
 * @param input.deadSpaceMl 0 to 2000
 * @throws RangeError outside these
 * @source alveolar ventilation equation (from memory)
 * @example predictedPaco2MmHg({ paco2MmHg: 60, fromTidalVolumeMl: 420, fromRespiratoryRate: 20, toTidalVolumeMl: 420, toRespiratoryRate: 25, deadSpaceMl: 150 }) //=> 48
 */
export function predictedPaco2MmHg(input: {
  paco2MmHg: number;
  fromTidalVolumeMl: number;
  fromRespiratoryRate: number;
  toTidalVolumeMl: number;
  toRespiratoryRate: number;
  deadSpaceMl: number;
}): number {
  const paco2MmHg = requireCharted("paco2MmHg", input.paco2MmHg);
  const deadSpaceMl = requireInRange("deadSpaceMl", input.deadSpaceMl, derivedRanges.deadSpaceMl);
  const from = { tidalVolumeMl: input.fromTidalVolumeMl, respiratoryRate: input.fromRespiratoryRate, deadSpaceMl };
  const to = { tidalVolumeMl: input.toTidalVolumeMl, respiratoryRate: input.toRespiratoryRate, deadSpaceMl };
  return (paco2MmHg * alveolarMlPerMin("from", from)) / alveolarMlPerMin("to", to);
}
