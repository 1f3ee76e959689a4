import { z } from "zod";
import { clientKeySchema, idSchema, instantSchema, reasonSchema } from "./fields";
import { heightIssues, heightShape } from "./heights";
import {
  addIssues,
  checkMechanics,
  checkObservations,
  mechanicsValuesSchema,
  observationsValuesSchema,
} from "./measurements";
import { settingsValuesSchema } from "./settings";

/** Kinds that can be charted so far; a kind is its route's last segment. */
export const entryKinds = ["settings", "settings-checks", "mechanics", "observations", "heights"] as const;

export type EntryKind = (typeof entryKinds)[number];

const chartedAt = { chartedAt: instantSchema };
const submitted = { ...chartedAt, clientKey: clientKeySchema };

/** The values in force that the form showed, for the fields this entry touches; null when nothing was in force. */
export const basedOnSchema = z.record(z.string(), z.union([z.number(), z.string(), z.null()])).nullable();

export type BasedOn = z.infer<typeof basedOnSchema>;

export const settingsBodySchema = z.strictObject({
  ...submitted,
  basedOn: basedOnSchema,
  reason: reasonSchema.optional(),
  ...settingsValuesSchema.shape,
});

export const settingsCheckBodySchema = z.strictObject({ ...submitted, basedOn: basedOnSchema });

export const mechanicsBodySchema = z
  .strictObject({ ...submitted, ...mechanicsValuesSchema.shape })
  .superRefine(checkMechanics);

export const observationsBodySchema = z
  .strictObject({ ...submitted, ...observationsValuesSchema.shape })
  .superRefine(checkObservations);

export const heightBodySchema = z
  .strictObject({ ...submitted, ...heightShape, reason: reasonSchema.optional() })
  .superRefine((height, context) => addIssues(context, heightIssues(height)));

export const bedsideEntryBodySchema = z
  .strictObject({
    ...submitted,
    basedOn: basedOnSchema,
    reason: reasonSchema.optional(),
    settings: settingsValuesSchema.optional(),
    mechanics: mechanicsValuesSchema.optional(),
    observations: observationsValuesSchema.optional(),
  })
  .refine((entry) => entry.settings ?? entry.mechanics ?? entry.observations, "Nothing was entered.");

/** The whole body of the kind being replaced, without its key: what it omits is not charted. */
const replacementSchemas = {
  settings: z.strictObject({ ...chartedAt, reason: reasonSchema.optional(), ...settingsValuesSchema.shape }),
  "settings-checks": z.strictObject(chartedAt),
  mechanics: z.strictObject({ ...chartedAt, ...mechanicsValuesSchema.shape }).superRefine(checkMechanics),
  observations: z.strictObject({ ...chartedAt, ...observationsValuesSchema.shape }).superRefine(checkObservations),
  heights: z
    .strictObject({ ...chartedAt, ...heightShape, reason: reasonSchema.optional() })
    .superRefine((height, context) => addIssues(context, heightIssues(height))),
} as const;

export function replacementSchemaOf<Kind extends EntryKind>(kind: Kind): (typeof replacementSchemas)[Kind] {
  return replacementSchemas[kind];
}

/** `entry` is checked against its kind's schema once the entry to be corrected, and so its kind, is known. */
export const correctionBodySchema = z
  .strictObject({
    clientKey: clientKeySchema,
    correction: z.enum(["replace", "void"]),
    reason: reasonSchema,
    entry: z.record(z.string(), z.unknown()).optional(),
  })
  .superRefine(({ correction, entry }, context) => {
    if (correction === "replace" && !entry)
      context.addIssue({ code: "custom", path: ["entry"], message: "Enter what it should say." });
    if (correction === "void" && entry)
      context.addIssue({ code: "custom", path: ["entry"], message: "A void replaces nothing." });
  });

export const submissionVoidBodySchema = z.strictObject({ clientKey: clientKeySchema, reason: reasonSchema });

export const patientParamsSchema = z.strictObject({ patientId: idSchema });
export const entryParamsSchema = z.strictObject({ patientId: idSchema, entryId: idSchema });
export const submissionParamsSchema = z.strictObject({ patientId: idSchema, submissionId: idSchema });

export type SettingsBody = z.infer<typeof settingsBodySchema>;
export type SettingsCheckBody = z.infer<typeof settingsCheckBodySchema>;
export type MechanicsBody = z.infer<typeof mechanicsBodySchema>;
export type ObservationsBody = z.infer<typeof observationsBodySchema>;
export type HeightBody = z.infer<typeof heightBodySchema>;
export type BedsideEntryBody = z.infer<typeof bedsideEntryBodySchema>;
export type CorrectionBody = z.infer<typeof correctionBodySchema>;
export type SubmissionVoidBody = z.infer<typeof submissionVoidBodySchema>;
