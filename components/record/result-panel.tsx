"use client";

import { useState } from "react";
import { VolumeLadder } from "@/components/figures/volume-ladder";
import { Button } from "@/components/ui/button";
import { useAnnounce } from "@/components/ui/announcer";
import { ladderOf } from "@/components/worksheet/ladder-of";
import { AskList } from "./ask-list";
import { EntryKeypad } from "./entry-keypad";
import { ReasonChoice } from "./reason-choice";
import styles from "./record.module.css";
import { ResultCells } from "./result-cells";
import { useIsTablet } from "./use-is-tablet";
import { useReserveFoot } from "./use-reserve-foot";
import { useRecord } from "./use-record";

interface ResultPanelProps {
  onSave: () => void;
  /** Stands in the way beyond the form itself ('The entry of 14:20 is still being sent.'). */
  hindrance: string | null;
}

/** Pinned: the live result, what is asked, the reason, Save, and the keypad while a number is typed. */
export function ResultPanel({ onSave, hindrance }: ResultPanelProps) {
  const { typing, live } = useRecord();
  const foot = useReserveFoot();
  const isTablet = useIsTablet();
  const { blocker, said, press, wanted } = useSave(onSave, hindrance);
  const ladder = ladderOf(live.sheet);
  return (
    <div ref={foot} className={styles.panel} data-keypad={typing.target ? "" : undefined} data-record-foot>
      <div className={styles.result}>
        <ResultCells />
        <div className={`${styles.ladder} pt-1`}>
          {ladder.pbwKg !== null && <VolumeLadder size="phone" {...ladder} />}
        </div>
        <div className={styles.asks}>
          <AskList wanted={wanted} />
          <ReasonChoice />
        </div>
        <div className={`${styles.save} py-1`}>
          <SaveButton ready={blocker === null} onPress={press} />
        </div>
      </div>
      {said && blocker && (
        <p role="alert" className="px-4 pb-2 t-small font-[560] text-outside tablet:px-6">
          {blocker}
        </p>
      )}
      {!isTablet && <EntryKeypad />}
    </div>
  );
}

function SaveButton({ ready, onPress }: { ready: boolean; onPress: () => void }) {
  const { readiness } = useRecord();
  return (
    <Button
      look={ready ? "primary" : "dashed"}
      size="entry"
      onClick={onPress}
      className={`${styles.saveButton} rounded-[10px] text-[17px]`}
    >
      <span>
        Save
        {readiness.departures.length > 0 && <span className={styles.long}>, outside, with reason</span>}
      </span>
    </Button>
  );
}

/** Pressing Save before the form is complete saves nothing and says what is missing. */
function useSave(onSave: () => void, hindrance: string | null) {
  const { readiness, typing } = useRecord();
  const announce = useAnnounce();
  const [said, setSaid] = useState(false);
  const [wanted, setWanted] = useState(0);
  const blocker = readiness.blocker ?? hindrance;
  const press = () => {
    if (readiness.asks.length > 0 || readiness.departures.length > 0) typing.close();
    if (blocker === null) return onSave();
    setSaid(true);
    announce(blocker);
    if (readiness.asks.length > 0) setWanted((times) => times + 1);
  };
  return { blocker, said, press, wanted };
}
