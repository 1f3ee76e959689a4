import { z } from "zod";
import { chartedRanges, isRefused, type ChartedField, type ChartedRange } from "../physiology/limits";
import { unitOf, wordsOf } from "./field-words";

/** A float such as 0.1 + 0.2 has more digits than anyone typed; compare against the rounded value. */
function decimalsOf(value: number): number {
  const text = String(value);
  if (text.includes("e-")) return Number.POSITIVE_INFINITY;
  return text.split(".")[1]?.length ?? 0;
}

function accepted(field: ChartedField): string {
  const { refuse, ...rest }: ChartedRange = chartedRanges[field];
  const unit = unitOf(field);
  const spelled = unit ? ` ${unit}` : "";
  return `${rest.zeroAllowed ? "0 or " : ""}${refuse.min} to ${refuse.max}${spelled}`;
}

/** Why a value is refused, and what is accepted: one sentence, or null when it may be charted. */
export function refusalOf(field: ChartedField, value: number): string | null {
  const { decimals }: ChartedRange = chartedRanges[field];
  if (!Number.isFinite(value)) return `${wordsOf(field)} is not a number: enter ${accepted(field)}.`;
  if (isRefused(field, value))
    return `${wordsOf(field)} ${value} is outside what can be charted: enter ${accepted(field)}.`;
  if (decimalsOf(value) > decimals) return `${wordsOf(field)} takes at most ${decimals} decimals.`;
  return null;
}

/** The schema of one charted number: finite, inside its refuse range, no more decimals than the field has. */
export function charted(field: ChartedField) {
  return z
    .number({ error: () => `${wordsOf(field)} is not a number: enter ${accepted(field)}.` })
    .superRefine((value, context) => {
      const refusal = refusalOf(field, value);
      if (refusal) context.addIssue({ code: "custom", message: refusal });
    });
}

/** FiO2 is a fraction here and a whole percent inside: anything between two whole percents is refused. */
export const fio2Schema = charted("fio2").refine(
  (fio2) => Math.abs(fio2 * 100 - Math.round(fio2 * 100)) <= 1e-6,
  "FiO2 is a fraction in whole percents: 0.21 to 1.00, such as 0.45.",
);

export const instantSchema = z.iso.datetime({
  offset: true,
  error: "A time needs its date and offset, such as 2026-12-01T14:20:00+01:00.",
});

export const clientKeySchema = z.uuid("The entry needs a key made on the device (a UUID).");

export const reasonSchema = z.string().trim().min(1, "Say why, in a few words.").max(200, "At most 200 characters.");

/** One way to write it, and never beyond what PostgreSQL's bigint holds. */
export const idSchema = z.string().regex(/^[1-9]\d{0,17}$/, "Not an id.");
