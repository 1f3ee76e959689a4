import { z } from "zod";
import { idSchema } from "./fields";
import {
  chartedValueSchema,
  causeSchema,
  derivedSchema,
  dueSchema,
  groupSchema,
  nextStepSchema,
  unitSchema,
} from "./worksheet";

export const unitParamsSchema = z.strictObject({ unitId: idSchema });

/** One bed: a free one has no patient. */
export const bedRowSchema = z.object({
  bed: z.object({ id: z.string(), label: z.string() }),
  patient: z
    .object({
      id: z.string(),
      name: z.string(),
      initials: z.string(),
      mrn: z.string(),
      birthDate: z.string(),
      ageYears: z.number().int(),
    })
    .nullable(),
  episode: z.object({ id: z.string(), day: z.number().int(), pausedSince: z.string().nullable() }).nullable(),
  state: groupSchema.nullable(),
  cause: z.array(causeSchema),
  settings: z.record(z.string(), chartedValueSchema).nullable(),
  derived: z.record(z.string(), derivedSchema),
  due: z.array(dueSchema),
  nextStep: nextStepSchema.nullable(),
});

export type BedRow = z.infer<typeof bedRowSchema>;

export const bedsAnswerSchema = z.object({
  unit: unitSchema,
  at: z.string(),
  validUntil: z.string().nullable(),
  counts: z.record(z.string(), z.number().int()),
  rows: z.array(bedRowSchema),
});

export type BedsAnswer = z.infer<typeof bedsAnswerSchema>;
