"use client";

import { useEffect, useEffectEvent, useState } from "react";
import { dropDraft, keepDraft, readDraft, type DraftOwner } from "@/lib/client/drafts";
import { recordDraftSchema, type RecordDraft } from "./record-draft";

interface DraftKeeping {
  owner: DraftOwner;
  /** What is to be kept now; null: nothing typed, nothing on its way. */
  draft: RecordDraft | null;
  onFound: (draft: RecordDraft) => void;
}

/**
 * Reads this person's draft for this episode once, and keeps every change on this device from then on. Another person,
 * or another episode, never sees it: the key names both. `failed`: the device refuses to keep it.
 */
export function useRecordDraft({ owner, draft, onFound }: DraftKeeping): { failed: boolean } {
  const { userId, episodeId, form } = owner;
  const [read, setRead] = useState(false);
  const [failed, setFailed] = useState(false);
  const found = useEffectEvent(onFound);

  useEffect(() => {
    let wanted = true;
    const take = (kept: RecordDraft | null) => {
      if (!wanted) return;
      if (kept) found(kept);
      setRead(true);
    };
    readDraft({ userId, episodeId, form }, recordDraftSchema).then(take, () => take(null));
    return () => {
      wanted = false;
    };
  }, [userId, episodeId, form]);

  const text = draft && JSON.stringify(draft);
  useEffect(() => {
    if (!read) return;
    let wanted = true;
    const kept = { userId, episodeId, form };
    const done = text === null ? dropDraft(kept) : keepDraft(kept, JSON.parse(text));
    const say = (refused: boolean) => {
      if (wanted) setFailed(refused);
    };
    done.then(
      () => say(false),
      () => say(true),
    );
    return () => {
      wanted = false;
    };
  }, [userId, episodeId, form, text, read]);
  return { failed };
}
