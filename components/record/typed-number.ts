import { refusalOf } from "@/lib/contracts";
import { fio2FromInput } from "@/lib/format";
import type { ChartedField } from "@/lib/physiology";
import { wordsOf } from "@/lib/contracts";

export type Typed = { value: number } | { refusal: string } | null;

const numeral = /^[-−]?(\d+[.,]?\d*|[.,]\d+)$/;

/** What typed text says: a number that may be charted, a sentence why not, or null where nothing stands. */
export function typedNumber(field: ChartedField, text: string): Typed {
  const trimmed = text.trim();
  if (trimmed === "") return null;
  if (field === "fio2") {
    const taken = fio2FromInput(trimmed);
    return "fraction" in taken ? { value: taken.fraction } : taken;
  }
  if (!numeral.test(trimmed)) return { refusal: `${wordsOf(field)} '${trimmed}' is not a number.` };
  const value = Number(trimmed.replace(",", ".").replace("−", "-"));
  const refusal = refusalOf(field, value);
  return refusal ? { refusal } : { value };
}

/** The number alone, where one stands that may be charted. */
export function chartable(field: ChartedField, text: string | undefined): number | null {
  const typed = typedNumber(field, text ?? "");
  return typed && "value" in typed ? typed.value : null;
}
