import { z } from "zod";
import { bedsideEntryBodySchema, clientKeySchema, settingsCheckBodySchema } from "@/lib/contracts";
import { filledSchema } from "./filled";
import { recordValuesSchema } from "./record-values";

const entrySchema = z.discriminatedUnion("route", [
  z.object({ route: z.literal("bedside-entries"), body: bedsideEntryBodySchema }),
  z.object({ route: z.literal("settings-checks"), body: settingsCheckBodySchema }),
]);

/** An entry on its way: the body under its key, and the form it came from, should the server refuse it. */
const sendingSchema = z.object({ entry: entrySchema, values: recordValuesSchema, filled: filledSchema });

export type Sending = z.infer<typeof sendingSchema>;

/** What is kept on this device until the server has it: typed work, what it started from, and its key. */
export const recordDraftSchema = z.object({
  version: z.literal(1),
  values: recordValuesSchema,
  /** Null: nothing typed, only something on its way. */
  filled: filledSchema.nullable(),
  clientKey: clientKeySchema,
  /** Bed at opening, to say so when the patient has moved. */
  bedId: z.string().nullable(),
  /** Being sent and not answered yet: after a reload it goes on under the same key. */
  sending: sendingSchema.nullable(),
});

export type RecordDraft = z.infer<typeof recordDraftSchema>;
