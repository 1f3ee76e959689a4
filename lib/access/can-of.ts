import { entryKinds, type EntryKind } from "@/lib/contracts";
import { can } from "./can";
import { settingsFieldsFor } from "./fields";
import type { PatientRow } from "./granted";
import type { Right } from "./rights";

/** What the worksheet tells its reader they may do with this patient; screens ask it, and never for roles. */
export function canOf({ member, policy, endedAt }: PatientRow) {
  const may = (right: Right) => can(member, right, policy);
  const open = endedAt === null;
  const kinds = entryKinds.map((kind) => [kind, open && may(`${kind}:chart`)]);
  return {
    ...(Object.fromEntries(kinds) as Record<EntryKind, boolean>),
    settingsFields: open ? settingsFieldsFor(member, policy) : [],
    correct: may("entries:correct"),
    moveBed: open && may("episode:manage"),
    endEpisode: open && may("episode:manage"),
  };
}
