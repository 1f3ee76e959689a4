"use client";

import { useState } from "react";
import { shownNumber } from "./drafted-settings";
import { FieldRow } from "./field-row";
import { expiratoryPartsOf, inspiratoryTimeFromIe } from "./inspiratory-time-from-ie";
import { useRecord } from "./use-record";

/** Expiration in parts to one of inspiration: from half (inspiration twice as long) to ten times. */
const accepted = { min: 0.1, max: 20 };

/** I:E as it is read off the ventilator; charted as the inspiratory time it stands for at the set rate. */
export function IeRow() {
  const { values, filled, set } = useRecord().editing;
  const [text, setText] = useState("");
  const rate = shownNumber(values, filled, "respiratoryRate");
  const inspiration = shownNumber(values, filled, "inspiratoryTimeS");
  const now = rate && inspiration ? expiratoryPartsOf({ respiratoryRate: rate, inspiratoryTimeS: inspiration }) : null;
  const type = (next: string) => {
    setText(next);
    const parts = Number(next.replace(",", "."));
    if (!rate || !(parts >= accepted.min && parts <= accepted.max)) return;
    set("settings.inspiratoryTimeS", String(inspiratoryTimeFromIe({ respiratoryRate: rate, expiratoryParts: parts })));
  };
  const sub = rate ? `now 1 : ${now === null ? "?" : now.toFixed(1)}, charted as seconds` : "needs the rate";
  return (
    <FieldRow label="I:E" sub={sub}>
      <label className="flex h-14 w-[204px] shrink-0 items-center gap-2 rounded-[8px] px-4 control">
        <span className="n-step">1 :</span>
        <input
          aria-label="I:E, 1 to"
          inputMode="decimal"
          autoComplete="off"
          disabled={!rate}
          value={text}
          onChange={(event) => type(event.target.value)}
          className="min-w-0 flex-1 bg-transparent n-step"
        />
      </label>
    </FieldRow>
  );
}
