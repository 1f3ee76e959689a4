import type { z } from "zod";
import type { Issue } from "./problem";

/** A name the schema does not know is reported at its own path, not at its parent's. */
function issuesOfOne(issue: z.core.$ZodIssue): Issue[] {
  const path = issue.path.map(String).join(".");
  if (issue.code !== "unrecognized_keys") return [{ path, message: issue.message }];
  return issue.keys.map((key) => ({
    path: path ? `${path}.${key}` : key,
    message: "This field is not accepted here.",
  }));
}

/** Every refusal of a schema once, each at its dotted path. */
export function issuesOf(error: z.ZodError): Issue[] {
  const issues = error.issues.flatMap(issuesOfOne);
  return [...new Map(issues.map((issue) => [`${issue.path}\n${issue.message}`, issue])).values()];
}
