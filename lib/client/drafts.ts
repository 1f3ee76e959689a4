import type { z } from "zod";
import { dropFromDevice, keepOnDevice, readFromDevice } from "./device-store";

/** Whose draft, for which episode: never for a bed, and never anything that names a patient. */
export interface DraftOwner {
  userId: string;
  episodeId: string;
  form: "record" | "height";
}

export function draftKey({ userId, episodeId, form }: DraftOwner): string {
  return `draft:${userId}:${episodeId}:${form}`;
}

/** This person's draft for this episode, or null: none, or one that an older version wrote in another shape. */
export async function readDraft<Schema extends z.ZodType>(
  owner: DraftOwner,
  schema: Schema,
): Promise<z.output<Schema> | null> {
  const kept = await readFromDevice(draftKey(owner));
  const draft = schema.safeParse(kept);
  return draft.success ? draft.data : null;
}

export function keepDraft(owner: DraftOwner, draft: unknown): Promise<void> {
  return keepOnDevice(draftKey(owner), draft);
}

export function dropDraft(owner: DraftOwner): Promise<void> {
  return dropFromDevice(draftKey(owner));
}
