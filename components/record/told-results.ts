import type { VentilationMode } from "@/lib/physiology";
import { resultWords, type ResultWords } from "./result-words";
import type { RecordState } from "./use-record";

const spontaneous: readonly (VentilationMode | null)[] = ["CSV-PS", "CPAP"];

/** The two numbers that decide harm, in words, as the form and the page after it say them. */
export function toldResults({ live, worksheet, mode }: RecordState): { volume: ResultWords; driving: ResultWords } {
  const { timeZone } = worksheet.unit;
  const whyNotAsked = spontaneous.includes(mode) ? "spontaneous" : null;
  return {
    volume: resultWords(live.volume, {
      unit: "mL/kg",
      decimals: 1,
      timeZone,
      needs: worksheet.pbwKg === null ? "needs height" : "needs exhaled volume",
      whyNotAsked,
    }),
    driving: resultWords(live.driving, { unit: "cmH2O", decimals: 0, timeZone, needs: "needs plateau", whyNotAsked }),
  };
}
