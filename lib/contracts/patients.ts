import { z } from "zod";
import { clientKeySchema, idSchema, instantSchema } from "./fields";
import { addIssues } from "./measurements";
import { heightIssues, heightShape } from "./heights";

const admissionHeightSchema = z
  .strictObject({ ...heightShape, chartedAt: instantSchema.optional() })
  .superRefine((height, context) => addIssues(context, heightIssues(height)));

/** Admission: identity, bed and when the tube went in. Under 16 is refused by the use case, from the birth date. */
export const admissionBodySchema = z.strictObject({
  clientKey: clientKeySchema,
  mrn: z.string().trim().min(1, "Enter the MRN.").max(32, "An MRN has at most 32 characters."),
  name: z.string().trim().min(1, "Enter the full name.").max(200, "At most 200 characters."),
  birthDate: z.iso.date("Enter the birth date."),
  unitId: idSchema,
  bedId: idSchema,
  intubatedAt: instantSchema,
  height: admissionHeightSchema.optional(),
  reasonForVentilation: z.string().trim().max(200).optional(),
  ardsRiskFactor: z.string().trim().max(200).optional(),
  tubeSizeMm: z.number().min(2).max(12).optional(),
  tubeDepthCm: z.number().min(5).max(40).optional(),
});

export type AdmissionBody = z.infer<typeof admissionBodySchema>;

export const admissionAnswerSchema = z.object({
  patient: z.object({ id: z.string(), name: z.string(), birthDate: z.string(), mrn: z.string() }),
  episode: z.object({ id: z.string(), unitId: z.string(), bedId: z.string(), intubatedAt: z.string() }),
});

export type AdmissionAnswer = z.infer<typeof admissionAnswerSchema>;
