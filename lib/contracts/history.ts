import { z } from "zod";
import { entryKinds } from "./entries";
import { authorSchema } from "./worksheet";

export const entriesQuerySchema = z.strictObject({
  kind: z.enum(entryKinds).optional(),
  field: z.string().max(60).optional(),
  before: z
    .string()
    .regex(/^[\w.:+-]+$/)
    .max(120)
    .optional(),
});

export const entrySchema = z.object({
  id: z.string(),
  kind: z.enum(entryKinds),
  submissionId: z.string(),
  chartedAt: z.string(),
  recordedAt: z.string(),
  author: authorSchema,
  /** Null for a void row: it has no content of its own. */
  body: z.record(z.string(), z.unknown()).nullable(),
  correction: z.enum(["replace", "void"]).nullable(),
  supersedesId: z.string().nullable(),
  supersededById: z.string().nullable(),
  reason: z.string().nullable(),
});

export type Entry = z.infer<typeof entrySchema>;

/** Newest first; `next` is the `before` of the following page, null on the last. */
export const entriesAnswerSchema = z.object({ entries: z.array(entrySchema), next: z.string().nullable() });

export type EntriesAnswer = z.infer<typeof entriesAnswerSchema>;
