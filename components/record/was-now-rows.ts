import { displayNumber } from "@/lib/format";
import type { Worksheet } from "@/lib/contracts";
import { mechanicsStyles, observationStyles, settingStyles } from "./form-fields";
import { holdWords } from "./hold-words";
import type { Sending } from "./record-draft";
import { settingValueWords, settingWords } from "./setting-words";

export interface WasNow {
  label: string;
  unit: string;
  was: string | null;
  now: string;
}

const plain = (value: unknown, decimals = 0): string => {
  if (typeof value !== "number") return value === true ? "yes" : value === false ? "no" : String(value);
  return displayNumber({ value, decimals: Number.isInteger(value) ? decimals : Math.max(1, decimals) });
};

function settingRows({ entry, filled }: Sending): WasNow[] {
  if (entry.route !== "bedside-entries") return [];
  const changed = Object.entries(entry.body.settings ?? {}).filter(([field, value]) => filled.values[field] !== value);
  return changed.map(([field, value]) => {
    const style = settingStyles[field as keyof typeof settingStyles];
    const was = filled.values[field];
    return {
      label: settingWords(field),
      unit: style && field !== "fio2" ? style.unit.replace("VT, ", "") : "",
      was: was === undefined || was === null ? null : settingValueWords(field, was),
      now: settingValueWords(field, value),
    };
  });
}

function measuredRows(sending: Sending, last: Pick<Worksheet, "mechanics" | "observations">): WasNow[] {
  const { entry } = sending;
  if (entry.route !== "bedside-entries") return [];
  const { mechanics = {}, observations = {} } = entry.body;
  const numbers = (
    part: "mechanics" | "observations",
    fields: object,
    styles: Record<string, { label: string; unit: string }>,
  ) =>
    Object.entries(fields).flatMap(([field, value]): WasNow[] => {
      const style = styles[field];
      if (!style || typeof value !== "number") return [];
      const was = last[part]?.[field]?.value;
      const hold = field === "plateauCmH2O" && mechanics.hold ? `${holdWords[mechanics.hold]} hold` : style.unit;
      return [{ label: style.label, unit: hold, was: was === undefined ? null : plain(was), now: plain(value) }];
    });
  const words: WasNow[] = [
    mechanics.hold === "not-possible"
      ? { label: "Hold", unit: mechanics.holdReason ?? "", was: null, now: "not possible" }
      : null,
    mechanics.breathStacking === undefined
      ? null
      : { label: "Breath stacking", unit: "", was: null, now: mechanics.breathStacking ? "seen" : "not seen" },
    mechanics.endInspiratoryFlowZero === undefined
      ? null
      : {
          label: "Flow at end of inspiration",
          unit: "",
          was: null,
          now: mechanics.endInspiratoryFlowZero ? "zero" : "not zero",
        },
  ].filter((row) => row !== null);
  return [
    ...numbers("mechanics", mechanics, mechanicsStyles),
    ...words,
    ...numbers("observations", observations, observationStyles),
  ];
}

/** What an entry charts, beside what stood there before. */
export function wasNowRows(sending: Sending, last: Pick<Worksheet, "mechanics" | "observations">): WasNow[] {
  return [...settingRows(sending), ...measuredRows(sending, last)];
}
