import type { z } from "zod";
import { AppError, issuesOf } from "@/lib/contracts";

/** The value as its schema makes it, or 422 with every issue at once, each at its dotted path. */
export function checked<Schema extends z.ZodType>(schema: Schema, value: unknown): z.output<Schema> {
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  throw new AppError("validation-failed", "Some values cannot be accepted.", {
    errors: issuesOf(result.error),
  });
}

/** An id that cannot exist answers like one that does not. */
export function checkedParams<Schema extends z.ZodType>(schema: Schema, params: unknown): z.output<Schema> {
  const result = schema.safeParse(params);
  if (result.success) return result.data;
  throw new AppError("not-found", "Nothing is found at this address.");
}
