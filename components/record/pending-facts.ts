import type { Facts } from "@/lib/protocol/facts";
import { withEntry } from "./draft-facts";
import type { Sending } from "./record-draft";

/** An entry of this page: on its way, saved, or struck again. */
export interface Pending extends Sending {
  /** Known once it is saved. */
  submissionId: string | null;
  entryIds: string[];
  undo: "none" | "asked" | "done";
}

const holds = (facts: Facts, id: string) =>
  [...(facts.settings ?? []), ...(facts.mechanics ?? []), ...(facts.observations ?? [])].some((fact) => fact.id === id);

/** The record with this page's entry in it, until the record itself has it. */
export function withPending(facts: Facts, pending: Pending | null): Facts {
  if (!pending || pending.undo === "done" || pending.entry.route !== "bedside-entries") return facts;
  if (pending.entryIds.some((id) => holds(facts, id))) return facts;
  return withEntry(facts, pending.entry.body);
}
