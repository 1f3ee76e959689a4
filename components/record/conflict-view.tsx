"use client";

import { useState } from "react";
import { Quantity } from "@/components/figures/quantity";
import { Subscripted } from "@/components/figures/subscripted";
import { Button } from "@/components/ui/button";
import type { FieldConflict } from "@/lib/contracts";
import { timeOfDay } from "@/lib/format";
import { PatientHeader } from "./patient-header";
import { isCharted, settleConflict, type Choice } from "./settle-conflict";
import { settingValueWords, settingWords } from "./setting-words";
import { useRecord } from "./use-record";
import type { RecordScreenState } from "./use-record-screen";
import styles from "./record.module.css";

/** Two people charted the same settings: both values are shown, and a person chooses; neither is lost unseen. */
export function ConflictView({ screen, onHeight }: { screen: RecordScreenState; onHeight: () => void }) {
  const { worksheet, editing } = useRecord();
  const { conflict } = screen;
  const [choices, setChoices] = useState<Partial<Record<string, Choice>>>({});
  const open = conflict.filter((each) => isCharted(each) && choices[each.field] === undefined);
  const save = () => open.length === 0 && screen.settle(...spread(settleConflict({ ...editing, conflict, choices })));
  return (
    <>
      <PatientHeader worksheet={worksheet} onHeight={onHeight} />
      <div className="flex-1 px-4 py-4 tablet:px-6 desk:px-8">
        <h2 className="t-title">Charted meanwhile</h2>
        <p className="max-w-[60ch] pt-1 pb-3 t-body">
          Since this form was filled, someone else charted settings that your entry touches. Nothing of yours is lost:
          choose for each what stands.
        </p>
        <div className="max-w-[760px] border-t-2 border-ink">
          {conflict.map((each) => (
            <ConflictRow
              key={each.field}
              conflict={each}
              choice={choices[each.field]}
              onChoose={(choice) => setChoices((made) => ({ ...made, [each.field]: choice }))}
            />
          ))}
        </div>
      </div>
      <div className={`${styles.panel} flex flex-wrap items-center gap-3 px-4 py-3 tablet:px-6`}>
        <Button size="save" onClick={() => screen.settle(editing.values, editing.filled)}>
          Back to the form
        </Button>
        <Button size="save" look={open.length === 0 ? "primary" : "dashed"} onClick={save} className="flex-1">
          Save with these
        </Button>
      </div>
    </>
  );
}

const spread = ({ values, filled }: ReturnType<typeof settleConflict>) => [values, filled] as const;

interface ConflictRowProps {
  conflict: FieldConflict;
  choice: Choice | undefined;
  onChoose: (choice: Choice) => void;
}

function ConflictRow({ conflict, choice, onChoose }: ConflictRowProps) {
  const { worksheet } = useRecord();
  const { field, yours, basedOn, inForce } = conflict;
  const words = (value: number | string | null) => settingValueWords(field, value);
  const by = inForce
    ? `${inForce.author.name}, ${timeOfDay({ at: inForce.chartedAt, timeZone: worksheet.unit.timeZone })}`
    : "no longer set";
  return (
    <section aria-label={settingWords(field)} className="py-3 rule-row">
      <h3 className="t-head">
        <Subscripted text={settingWords(field)} />
        <span className="font-normal text-muted">, your form showed {words(basedOn)}</span>
      </h3>
      {isCharted(conflict) ? (
        <div className="grid grid-cols-2 gap-2 pt-2">
          <Side
            name="Mine"
            value={words(yours)}
            by="this entry"
            chosen={choice === "mine"}
            onChoose={() => onChoose("mine")}
          />
          <Side
            name="Theirs"
            value={words(inForce?.value ?? null)}
            by={by}
            chosen={choice === "theirs"}
            onChoose={() => onChoose("theirs")}
          />
        </div>
      ) : (
        <p className="pt-1 t-body">
          Now <Quantity text={words(inForce?.value ?? null)} className="font-[640]" /> ({by}). Your reading will count
          with it. If it was taken before that change, go back and set its time.
        </p>
      )}
    </section>
  );
}

interface SideProps {
  name: string;
  value: string;
  by: string;
  chosen: boolean;
  onChoose: () => void;
}

function Side({ name, value, by, chosen, onChoose }: SideProps) {
  return (
    <button
      type="button"
      aria-pressed={chosen}
      onClick={onChoose}
      className={`min-h-[84px] rounded-[8px] px-4 py-2 text-left ${chosen ? "border-[2.5px] border-accent bg-accent-soft" : "control"}`}
    >
      <span className="flex items-baseline justify-between gap-2">
        <b className="t-state">
          {chosen && <span aria-hidden="true">✓ </span>}
          {name}
        </b>
        <Quantity text={value} className="n-cell" />
      </span>
      <span className="block t-label text-muted">{by}</span>
    </button>
  );
}
