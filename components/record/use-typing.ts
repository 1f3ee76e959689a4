"use client";

import { useCallback, useState } from "react";
import { sameTarget, targetName, type TypingTarget } from "./typing";
import type { RecordEditing } from "./use-record-values";

export interface Typing {
  target: TypingTarget | null;
  /** What has been typed since the keypad opened: a first digit replaces what stood there. */
  text: string;
  open: (target: TypingTarget, firstKey?: string) => void;
  type: (text: string) => void;
  close: () => void;
}

type Named = Pick<RecordEditing, "set" | "values">;

/** The keypad: which field it is open for, and what it has typed there. */
export function useTyping({ set, values }: Named): Typing {
  const [target, setTarget] = useState<TypingTarget | null>(null);
  const [text, setText] = useState("");
  const write = useCallback(
    (into: TypingTarget, next: string) => {
      setText(next);
      set(targetName(into), next);
    },
    [set],
  );
  const open = (next: TypingTarget, firstKey?: string) => {
    if (sameTarget(target, next)) {
      if (firstKey !== undefined) write(next, text + firstKey);
      return;
    }
    setTarget(next);
    if (firstKey === undefined) setText(next.part === "settings" ? "" : (values[next.part][next.field] ?? ""));
    else write(next, firstKey);
  };
  return {
    target,
    text,
    open,
    type: (next) => target && write(target, next),
    close: () => setTarget(null),
  };
}
