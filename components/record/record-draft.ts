import { z } from "zod";
import { bedsideEntryBodySchema, clientKeySchema, settingsCheckBodySchema } from "@/lib/contracts";
import { filledSchema } from "./filled";
import { recordValuesSchema } from "./record-values";

export const sendingSchema = z.discriminatedUnion("route", [
  z.object({ route: z.literal("bedside-entries"), body: bedsideEntryBodySchema }),
  z.object({ route: z.literal("settings-checks"), body: settingsCheckBodySchema }),
]);

export type Sending = z.infer<typeof sendingSchema>;

/** What is kept on this device until the server has it: typed work, what it started from, and its key. */
export const recordDraftSchema = z.object({
  version: z.literal(1),
  values: recordValuesSchema,
  filled: filledSchema,
  clientKey: clientKeySchema,
  /** Bed at opening, to say so when the patient has moved. */
  bedId: z.string().nullable(),
  /** Being sent and not answered yet: after a reload it goes on under the same key. */
  sending: sendingSchema.nullable(),
});

export type RecordDraft = z.infer<typeof recordDraftSchema>;
