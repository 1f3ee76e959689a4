import { refusedFields } from "@/lib/access/fields";
import { rights, type Right, type RightScope } from "@/lib/access/rights";
import type { RowOf } from "@/lib/access/granted";
import { AppError } from "@/lib/contracts";

/** 403 naming every field that this person's role may not send. */
function forbiddenFields(names: readonly string[]): AppError {
  return new AppError("forbidden", `Your role may not chart this here: ${names.join(", ")}.`, {
    errors: names.map((path) => ({ path, message: "Your role may not chart this here." })),
  });
}

/** The fields a restricted right leaves out are refused for every body, before anything else is said of it. */
export function refuseFields(right: Right, granted: RowOf<RightScope>, json: unknown): void {
  if (rights[right].scope !== "patient" || !("member" in granted)) return;
  const names = refusedFields(granted.member, right, granted.policy, json);
  if (names.length > 0) throw forbiddenFields(names);
}
