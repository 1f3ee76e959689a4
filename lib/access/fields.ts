import { settingsValuesSchema } from "@/lib/contracts";
import type { Member, RightsPolicy } from "./can";
import { rights, type Right } from "./rights";

const everySetting: readonly string[] = Object.keys(settingsValuesSchema.shape);

/** What a settings body may hold beside its values. */
const carriers = ["chartedAt", "clientKey", "basedOn", "reason"];

function onlyFio2(member: Member, right: Right, policy: RightsPolicy): boolean {
  return rights[right][member.role] === "fio2-only" && !policy.nursesSetVentilators;
}

/** The settings this member may chart in the unit; empty for none. */
export function settingsFieldsFor(member: Member, policy: RightsPolicy): string[] {
  if (onlyFio2(member, "settings:chart", policy)) return ["fio2"];
  return rights["settings:chart"][member.role] === "no" ? [] : [...everySetting];
}

const isObject = (value: unknown): value is Record<string, unknown> => typeof value === "object" && value !== null;

function namesBeyond(body: unknown, accepted: readonly string[], prefix = ""): string[] {
  if (!isObject(body)) return [];
  return Object.keys(body)
    .filter((name) => !accepted.includes(name))
    .map((name) => prefix + name);
}

/** Every name inside one part of a bedside entry; an empty part is named itself. */
function namesOfPart(body: Record<string, unknown>, part: string): string[] {
  if (body[part] === undefined) return [];
  const inside = namesBeyond(body[part], [], `${part}.`);
  return inside.length > 0 ? inside : [part];
}

/**
 * The fields of a body that this member may not send under this right, as dotted paths. Asked of the JSON as sent,
 * before its schema: a role that may not send a field learns that first.
 */
export function refusedFields(member: Member, right: Right, policy: RightsPolicy, json: unknown): string[] {
  if (!isObject(json)) return [];
  if (right === "bedside-entries:chart") return refusedAtTheBedside(member, policy, json);
  if (right === "settings:chart" && onlyFio2(member, right, policy)) return namesBeyond(json, ["fio2", ...carriers]);
  if (rights[right][member.role] === "cuff-only") return namesBeyond(json, ["cuffCmH2O", ...carriers]);
  return [];
}

/** A nurse's bedside entry: FiO2 alone among settings, and no mechanics (cuff pressure is an airway check). */
function refusedAtTheBedside(member: Member, policy: RightsPolicy, json: Record<string, unknown>): string[] {
  const settings = onlyFio2(member, "settings:chart", policy) ? namesBeyond(json.settings, ["fio2"], "settings.") : [];
  const mechanics = rights["mechanics:chart"][member.role] === "no" ? namesOfPart(json, "mechanics") : [];
  return [...settings, ...mechanics];
}
