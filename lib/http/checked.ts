import type { z } from "zod";
import { AppError, type Issue } from "@/lib/contracts";

type ZodIssue = z.core.$ZodIssue;

/** A name the schema does not know is reported at its own path, not at its parent's. */
function issuesOf(issue: ZodIssue): Issue[] {
  const path = issue.path.map(String).join(".");
  if (issue.code !== "unrecognized_keys") return [{ path, message: issue.message }];
  return issue.keys.map((key) => ({
    path: path ? `${path}.${key}` : key,
    message: "This field is not accepted here.",
  }));
}

function deduplicated(issues: Issue[]): Issue[] {
  const seen = new Map(issues.map((issue) => [`${issue.path}\n${issue.message}`, issue]));
  return [...seen.values()];
}

/** The value as its schema makes it, or 422 with every issue at once, each at its dotted path. */
export function checked<Schema extends z.ZodType>(schema: Schema, value: unknown): z.output<Schema> {
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  throw new AppError("validation-failed", "Some values cannot be accepted.", {
    errors: deduplicated(result.error.issues.flatMap(issuesOf)),
  });
}

/** An id that cannot exist answers like one that does not. */
export function checkedParams<Schema extends z.ZodType>(schema: Schema, params: unknown): z.output<Schema> {
  const result = schema.safeParse(params);
  if (result.success) return result.data;
  throw new AppError("not-found", "Nothing is found at this address.");
}
