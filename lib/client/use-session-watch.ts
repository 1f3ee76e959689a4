"use client";

import { useCallback, useEffect, useState, useSyncExternalStore } from "react";
import { meSchema, type Me } from "@/lib/contracts";
import { request } from "./api";
import { onOtherTabs } from "./session-channel";
import { onSessionLoss } from "./session-loss";
import { watchSession, type SessionState, type SessionWatch } from "./session-watch";

const CHECK_EVERY_MS = 15_000;

/** Keys, touches, the clock, a page that comes into view, and any answer that says 401. */
function watchPage(watch: SessionWatch): () => void {
  const check = () => void watch.check();
  const ifSeen = () => document.visibilityState === "visible" && check();
  const timer = setInterval(check, CHECK_EVERY_MS);
  const stopHearing = onSessionLoss(watch.lose);
  addEventListener("keydown", watch.act, { passive: true });
  addEventListener("pointerdown", watch.act, { passive: true });
  document.addEventListener("visibilitychange", ifSeen);
  return () => {
    clearInterval(timer);
    stopHearing();
    removeEventListener("keydown", watch.act);
    removeEventListener("pointerdown", watch.act);
    document.removeEventListener("visibilitychange", ifSeen);
  };
}

interface Watched extends SessionState {
  /** Asks who is signed in now. The page opens again for its own person; for another it is loaded anew. */
  reopen: () => Promise<void>;
}

/** Follows the session of the person this page was made for. */
export function useSessionWatch(userId: string, session: Me["session"]): Watched {
  const [watch] = useState(() => watchSession(session));
  const state = useSyncExternalStore(watch.subscribe, watch.state, watch.state);
  const reopen = useCallback(async () => {
    const me = await request({ path: "/api/me", answer: meSchema });
    // What was typed here belongs to the person who typed it, and nobody else sees it.
    if (me.user.id !== userId) location.reload();
    else watch.opened(me.session);
  }, [userId, watch]);
  useEffect(() => watchPage(watch), [watch]);
  // A refusal is heard by every watch through `request`; a lost network changes nothing.
  useEffect(() => onOtherTabs(() => void reopen().catch(() => undefined)), [reopen]);
  return { ...state, reopen };
}
