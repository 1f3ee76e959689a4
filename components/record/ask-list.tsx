"use client";

import { useEffect, useRef } from "react";
import { Subscripted } from "@/components/figures/subscripted";
import { Button } from "@/components/ui/button";
import { stackedKey } from "./ask-about-reading";
import { useRecord } from "./use-record";

/** What is unusual about the entry, each let through by one more tap. */
export function AskList({ wanted }: { wanted: number }) {
  const { editing, readiness } = useRecord();
  const list = useRef<HTMLElement>(null);
  // Save was pressed with questions open: bring the person to them.
  useEffect(() => {
    if (wanted > 0) list.current?.querySelector("button")?.focus();
  }, [wanted]);
  if (readiness.asks.length === 0) return null;
  const answer = (key: string, yes: boolean) => {
    if (key === stackedKey) editing.set("breathStacking", yes);
    else editing.set("confirmed", [...editing.values.confirmed, key]);
  };
  return (
    <section ref={list} aria-label="To confirm" className="pb-2">
      {readiness.asks.map(({ key, question, yes, no }) => (
        <div
          key={key}
          role="group"
          aria-label={question}
          className="flex flex-wrap items-center justify-end gap-2 py-1.5"
        >
          <p className="min-w-[180px] flex-1 t-body font-[560]">
            <Subscripted text={question} />
          </p>
          <Button size="entry" onClick={() => answer(key, true)}>
            <Subscripted text={yes} />
          </Button>
          {no && (
            <Button size="entry" onClick={() => answer(key, false)}>
              {no}
            </Button>
          )}
        </div>
      ))}
    </section>
  );
}
