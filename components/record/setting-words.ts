import { displayNumber } from "@/lib/format";
import { modeLabel, type VentilationMode } from "@/lib/physiology";
import { settingStyles } from "./form-fields";

const words: Record<string, string> = {
  mode: "mode",
  flowPattern: "flow pattern",
  triggerType: "trigger",
};

/** A settings field in a sentence. */
export function settingWords(field: string): string {
  return words[field] ?? settingStyles[field as keyof typeof settingStyles]?.label ?? field;
}

/** A settings value in a sentence; 'none' where nothing was set. */
export function settingValueWords(field: string, value: number | string | null | undefined): string {
  if (value === null || value === undefined) return "none";
  if (field === "mode") return modeLabel(value as VentilationMode);
  if (field === "flowPattern") return value === "decelerating" ? "descending" : String(value);
  if (typeof value !== "number") return value;
  const style = settingStyles[field as keyof typeof settingStyles];
  return displayNumber({ value, decimals: style?.decimals ?? (Number.isInteger(value) ? 0 : 2) });
}
