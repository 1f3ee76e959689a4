import type { Role } from "@/lib/contracts";
import { rights, type Answer, type Right } from "./rights";

/** What a member is in one unit. */
export interface Member {
  role: Role;
  lead: boolean;
}

/** The lines of a unit's policy that the rights table looks at. */
export interface RightsPolicy {
  nursesSetVentilators: boolean;
}

function holds(answer: Answer, member: Member, policy: RightsPolicy): boolean {
  switch (answer) {
    case "yes":
    case "own-kinds":
    case "fio2-only":
    case "cuff-only":
      return true;
    case "lead":
      return member.lead;
    case "where-nurses-set":
      return policy.nursesSetVentilators;
    case "no":
      return false;
  }
}

/** Whether a member of the unit holds a right there; `refusedFields` says which fields a restricted right leaves out. */
export function can(member: Member, right: Right, policy: RightsPolicy): boolean {
  return holds(rights[right][member.role], member, policy);
}

export function administratorCan(right: Right): boolean {
  return rights[right].administrator === "yes";
}
