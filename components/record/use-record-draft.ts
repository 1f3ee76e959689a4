"use client";

import { useEffect, useState } from "react";
import { keepDraft, readDraft, type DraftOwner } from "@/lib/client/drafts";
import { recordDraftSchema, type RecordDraft } from "./record-draft";

/**
 * Reads this person's draft for this episode once. `undefined` while it is being read, null where there is none.
 * Another person, or another episode, never sees it: the key names both.
 */
export function useKeptDraft({ userId, episodeId, form }: DraftOwner): RecordDraft | null | undefined {
  const [kept, setKept] = useState<RecordDraft | null | undefined>(undefined);
  useEffect(() => {
    let wanted = true;
    const take = (draft: RecordDraft | null) => {
      if (wanted) setKept(draft);
    };
    readDraft({ userId, episodeId, form }, recordDraftSchema).then(take, () => take(null));
    return () => {
      wanted = false;
    };
  }, [userId, episodeId, form]);
  return kept;
}

/** Keeps the draft on this device on every change, and says when the device refuses. */
export function useKeepDraft(owner: DraftOwner, draft: RecordDraft | null): { failed: boolean } {
  const [failed, setFailed] = useState(false);
  const { userId, episodeId, form } = owner;
  const text = draft ? JSON.stringify(draft) : null;
  useEffect(() => {
    if (text === null) return;
    let wanted = true;
    const say = (refused: boolean) => {
      if (wanted) setFailed(refused);
    };
    keepDraft({ userId, episodeId, form }, JSON.parse(text)).then(
      () => say(false),
      () => say(true),
    );
    return () => {
      wanted = false;
    };
  }, [userId, episodeId, form, text]);
  return { failed };
}
