"use client";

import { useEffect, useState } from "react";
import { newClientKey } from "./new-client-key";

interface Word {
  key: string;
  tab: string;
  says: "open" | "here" | "closed";
}

const channelName = "neaptide-drafts";

/** Whether another tab of this browser has the same draft open: both would write over one another. */
export function useDraftInOtherTab(key: string): boolean {
  const [others, setOthers] = useState<ReadonlySet<string>>(new Set());
  useEffect(() => {
    if (typeof BroadcastChannel === "undefined") return;
    const tab = newClientKey();
    const channel = new BroadcastChannel(channelName);
    const say = (says: Word["says"]) => channel.postMessage({ key, tab, says } satisfies Word);
    const hear = ({ data }: MessageEvent<Word>) => {
      if (data.key !== key || data.tab === tab) return;
      if (data.says === "open") say("here");
      setOthers((known) => {
        const next = new Set(known);
        if (data.says === "closed") next.delete(data.tab);
        else next.add(data.tab);
        return next;
      });
    };
    const leave = () => say("closed");
    channel.addEventListener("message", hear);
    window.addEventListener("pagehide", leave);
    say("open");
    return () => {
      leave();
      window.removeEventListener("pagehide", leave);
      channel.close();
    };
  }, [key]);
  return others.size > 0;
}
