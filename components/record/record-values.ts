import { z } from "zod";
import { holdQualities, modeSchema } from "@/lib/contracts";

const typed = z.record(z.string(), z.string());

/** Why a setting leaves the order: one of three ready reasons, or the person's own words. */
export const reasonChoices = ["pH under 7.15", "Breath stacking", "Intensivist asked"] as const;

/**
 * What a person has put in, as typed, and nothing else: it survives whatever happens to the page. A field that is not
 * here shows what was in force at the form's time. Holds nothing that names a patient.
 */
export const recordValuesSchema = z.object({
  mode: modeSchema.nullable(),
  /** Text by numeric setting. */
  settings: typed,
  flowPattern: z.enum(["square", "decelerating"]).nullable(),
  triggerType: z.enum(["flow", "pressure"]).nullable(),
  /** Text by numeric measurement. */
  mechanics: typed,
  hold: z.enum(holdQualities).nullable(),
  holdReason: z.string(),
  endInspiratoryFlowZero: z.boolean().nullable(),
  breathStacking: z.boolean().nullable(),
  /** Text by numeric observation. */
  observations: typed,
  reason: z.string(),
  ownWords: z.boolean(),
  /** Keys of the questions this person has answered with yes. */
  confirmed: z.array(z.string()),
});

export type RecordValues = z.infer<typeof recordValuesSchema>;

export const emptyRecord: RecordValues = {
  mode: null,
  settings: {},
  flowPattern: null,
  triggerType: null,
  mechanics: {},
  hold: null,
  holdReason: "",
  endInspiratoryFlowZero: null,
  breathStacking: null,
  observations: {},
  reason: "",
  ownWords: false,
  confirmed: [],
};
