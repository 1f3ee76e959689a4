import { z } from "zod";
import type { SettingField, VentilationMode } from "@/lib/physiology";

const settingValue = z.union([z.number(), z.string(), z.null()]);

/** What the form was filled from: the settings in force at its time, as it showed them. */
export const filledSchema = z.object({
  /** ISO 8601 with the unit's offset; becomes the entry's `chartedAt`. */
  chartedAt: z.string(),
  values: z.record(z.string(), settingValue),
});

export type Filled = z.infer<typeof filledSchema>;

export function filledMode(filled: Filled): VentilationMode | null {
  return (filled.values["mode"] as VentilationMode | null | undefined) ?? null;
}

export function filledNumber(filled: Filled, field: SettingField): number | null {
  const value = filled.values[field];
  return typeof value === "number" ? value : null;
}

export function filledWord(filled: Filled, field: "flowPattern" | "triggerType"): string | null {
  const value = filled.values[field];
  return typeof value === "string" ? value : null;
}
