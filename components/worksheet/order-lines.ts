import { displayNumber } from "@/lib/format";
import type { Worksheet } from "@/lib/contracts";

type Range = { min?: number | undefined; max?: number | undefined } | null | undefined;

const write = (value: number, decimals: number) =>
  displayNumber({ value, decimals: Number.isInteger(value) ? decimals : Math.max(decimals, 1) });

/** '5 to 7', 'to 30', 'from 94', or null where nothing is ordered. */
export function rangeWords(range: Range, decimals = 0): string | null {
  if (!range) return null;
  const { min, max } = range;
  if (min !== undefined && max !== undefined) return `${write(min, decimals)} to ${write(max, decimals)}`;
  if (max !== undefined) return `to ${write(max, decimals)}`;
  if (min !== undefined) return `from ${write(min, decimals)}`;
  return null;
}

/** The targets in force as short lines, for under the span and for print. */
export function orderLines(targets: Worksheet["targets"]): string[] {
  const part = (label: string, words: string | null, unit = "") => (words ? `${label} ${words}${unit}` : null);
  const lines = [
    [
      part("VT", rangeWords(targets.vtMlPerKg), " mL/kg") ?? part("VT", rangeWords(targets.vtMl), " mL"),
      part("rate", rangeWords(targets.respiratoryRate)),
    ],
    [part("plateau", rangeWords(targets.plateauCmH2O)), part("ΔP", rangeWords(targets.drivingPressureCmH2O))],
    [part("SpO2", rangeWords(targets.spo2Percent)), part("PaO2", rangeWords(targets.pao2MmHg))],
    [part("pH", rangeWords(targets.ph, 2)), part("PaCO2", rangeWords(targets.paco2MmHg))],
  ];
  return lines.map((line) => line.filter((each) => each !== null).join(", ")).filter((line) => line !== "");
}
