import { fio2FromInput } from "./fio2-from-input";

/**
 * What the form took the typed FiO2 for, so that a percentage and a fraction are never confused unseen.
 * @returns null where the text is refused
 * @example fio2TakenText("60") //=> "taken as 60 %, 0.60"
 */
export function fio2TakenText(text: string): string | null {
  const taken = fio2FromInput(text);
  if ("refusal" in taken) return null;
  return `taken as ${Math.round(taken.fraction * 100)} %, ${taken.fraction.toFixed(2)}`;
}
