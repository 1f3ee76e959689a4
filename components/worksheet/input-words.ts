import { unitOf, wordsOf } from "@/lib/contracts";
import { displayNumber } from "@/lib/format";
import { chartedRanges, type ChartedField } from "@/lib/physiology";

const isCharted = (name: string): name is ChartedField => name in chartedRanges;

/** One input of a number in words: 'Plateau 27 cmH2O', 'PBW 70.6 kg'. */
export function inputWords(name: string, value: number | null): string {
  if (value === null) return name;
  if (name === "pbwKg") return `PBW ${displayNumber({ value, decimals: 1 })} kg`;
  if (name === "barometricPressureMmHg") return `Barometric pressure ${value} mmHg`;
  if (!isCharted(name)) return `${name} ${value}`;
  const text = name === "fio2" ? value.toFixed(2) : String(value);
  return [wordsOf(name), text, unitOf(name)].filter((part) => part !== "").join(" ");
}
