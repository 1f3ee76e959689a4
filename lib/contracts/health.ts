import { z } from "zod";

export const healthSchema = z.object({ status: z.literal("ok") });

/** Ready means: the database answers, every migration ran, and the application's role cannot rewrite the record. */
export const readySchema = z.object({ status: z.literal("ready") });
