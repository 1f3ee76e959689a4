import type { EntryKind } from "@/lib/contracts";
import { can, type Member, type RightsPolicy } from "./can";
import { refusedFields, settingsFieldsFor } from "./fields";
import { rights } from "./rights";

export interface Correction {
  kind: EntryKind;
  /** The values the entry to be corrected charts, by name; only a settings entry's are looked at. */
  charted: readonly string[];
  /** The replacement as sent; absent in a void. */
  entry?: unknown;
}

/**
 * What stands against this member's correcting or voiding an entry: `kind` when they may not chart its kind, else the
 * fields they may not chart, of the entry itself and of its replacement. Empty when they may.
 */
export function refusedByCorrection(member: Member, policy: RightsPolicy, correction: Correction): string[] {
  if (rights["entries:correct"][member.role] === "yes") return [];
  if (!can(member, `${correction.kind}:chart`, policy)) return ["kind"];
  if (correction.kind !== "settings") return [];
  const mine = settingsFieldsFor(member, policy);
  const ofTheEntry = correction.charted.filter((name) => !mine.includes(name));
  const ofTheReplacement = refusedFields(member, "settings:chart", policy, correction.entry);
  return [...ofTheEntry, ...ofTheReplacement.map((name) => `entry.${name}`)];
}
