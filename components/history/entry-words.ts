import { mechanicsFields, unitOf, wordsOf, type Entry } from "@/lib/contracts";
import { chartedRanges, modeLabel, settingFields, ventilationModes, type ChartedField } from "@/lib/physiology";

const holdWords: Record<string, string> = {
  relaxed: "hold relaxed",
  effort: "hold with effort",
  unsure: "hold not sure",
  "not-possible": "hold not possible",
};

const methodWords: Record<string, string> = {
  "measured-standing": "measured standing",
  "measured-lying": "measured lying, by tape",
  document: "from a document",
  ulna: "estimated by ulna",
  "knee-height": "estimated by knee height",
  demispan: "estimated by demispan",
  reported: "reported",
};

const isCharted = (field: string): field is ChartedField => field in chartedRanges;

/** One field of an entry in words: 'PEEP 12 cmH2O'. Null for what needs no words of its own. */
function fieldWords(field: string, value: unknown): string | null {
  if (field === "mode") return modeLabel(ventilationModes.find((mode) => mode === value) ?? "A/C-VC");
  if (field === "hold") return holdWords[String(value)] ?? null;
  if (field === "holdReason") return `because: ${String(value)}`;
  if (field === "method") return methodWords[String(value)] ?? null;
  if (field === "sexForPbw") return `${String(value)}, for PBW`;
  if (field === "flowPattern") return value === "square" ? "constant flow" : "descending flow";
  if (field === "triggerType") return null;
  if (field === "breathStacking") return value ? "breath stacking seen" : "no breath stacking";
  if (field === "endInspiratoryFlowZero")
    return value ? "flow zero at end of inspiration" : "flow not zero at end of inspiration";
  if (!isCharted(field) || typeof value !== "number") return null;
  const text = field === "fio2" ? value.toFixed(2) : String(value);
  return [wordsOf(field), text, unitOf(field)].filter((part) => part !== "").join(" ");
}

/** Mode, then the settings and readings in the order a form shows them; what has no place of its own stays last. */
const formOrder: readonly string[] = ["mode", ...settingFields, ...mechanicsFields];

const rankOf = (field: string) => (formOrder.includes(field) ? formOrder.indexOf(field) : formOrder.length);

/** What an entry charts, in form order, for the history and the corrections. */
export function entryWords(entry: Pick<Entry, "kind" | "body" | "correction">): string {
  if (entry.correction === "void" || !entry.body) return "Voided";
  if (entry.kind === "settings-checks") return "Settings checked, unchanged";
  const words = Object.entries(entry.body)
    .toSorted(([a], [b]) => rankOf(a) - rankOf(b))
    .filter(([field]) => field !== "chartedAt" && field !== "reason")
    .map(([field, value]) => (value === null ? null : fieldWords(field, value)))
    .filter((each) => each !== null);
  return words.length > 0 ? words.join(", ") : "Nothing charted";
}
