"use client";

import { Subscripted } from "@/components/figures/subscripted";
import { timeOfDay } from "@/lib/format";
import { modeLabel, numericSettingFields, type NumericSettingField } from "@/lib/physiology";
import { draftedMechanics, draftedObservations } from "./drafted-measurements";
import { isChanged } from "./drafted-settings";
import { filledMode } from "./filled";
import { settingRowsOf, settingStyles } from "./form-fields";
import styles from "./record.module.css";
import { useRecord, type RecordState } from "./use-record";

interface TitleRowProps {
  onTime: () => void;
  onMode: () => void;
  onCheck: () => void;
}

/** When, in which mode, and what is changed so far; 'Checked, unchanged' stands there until something is. */
export function TitleRow({ onTime, onMode, onCheck }: TitleRowProps) {
  const { mode, editing, worksheet } = useRecord();
  const time = timeOfDay({ at: editing.filled.chartedAt, timeZone: worksheet.unit.timeZone });
  const mayChangeMode = worksheet.can.settingsFields.includes("mode");
  return (
    <div className={`${styles.title} flex min-h-16 items-center px-4 tablet:px-0 tablet:pr-6 desk:pr-8`}>
      <Cell words={`At ${time}`} action="change" label={`Change the time, now ${time}`} onPress={onTime} first />
      <Cell
        words={mode ? modeLabel(mode) : "No mode"}
        action={mode ? "change" : "choose"}
        label={mode ? `Change the mode, now ${modeLabel(mode)}` : "Choose the mode"}
        onPress={mayChangeMode ? onMode : null}
      />
      <div className="ml-auto pl-2 max-[359px]:pl-1">
        <CheckOrChanged onCheck={onCheck} />
      </div>
    </div>
  );
}

interface CellProps {
  words: string;
  action: string;
  label: string;
  onPress: (() => void) | null;
  first?: boolean;
}

function Cell({ words, action, label, onPress, first = false }: CellProps) {
  const box = `flex min-h-[56px] flex-col justify-center text-left ${first ? "pr-4 max-[359px]:pr-2 tablet:border-l tablet:border-hair tablet:pl-5" : "border-l border-hair px-4 max-[359px]:px-2"}`;
  const title = <span className="text-[20px] leading-tight font-[680] min-[360px]:whitespace-nowrap">{words}</span>;
  if (!onPress) return <div className={box}>{title}</div>;
  return (
    <button type="button" aria-label={label} onClick={onPress} className={box}>
      {title}
      <span className="text-[15px] leading-tight text-accent underline underline-offset-3">{action}</span>
    </button>
  );
}

function changedWords({ editing, mode }: RecordState): string[] {
  const { values, filled } = editing;
  if (!mode) return [];
  if (mode !== filledMode(filled)) return ["mode"];
  const rows: NumericSettingField[] = settingRowsOf(mode);
  const ordered = [...rows, ...numericSettingFields.filter((field) => !rows.includes(field))];
  const fields = ordered.filter((field) => isChanged(values, filled, field));
  const words = fields.map((field) => settingStyles[field].short);
  return values.flowPattern && values.flowPattern !== filled.values["flowPattern"] ? [...words, "pattern"] : words;
}

function CheckOrChanged({ onCheck }: { onCheck: () => void }) {
  const record = useRecord();
  const { worksheet, editing } = record;
  const changed = changedWords(record);
  if (changed.length > 0) {
    return (
      <p className="max-w-[120px] text-right leading-tight">
        <span className="block t-label text-muted">changed</span>
        <b className="font-[680]">
          <Subscripted text={changed.length > 2 ? `${changed.length} settings` : changed.join(", ")} />
        </b>
      </p>
    );
  }
  const entered = draftedMechanics(editing.values) ?? draftedObservations(editing.values);
  // A check confirms settings and charts nothing else: beside typed measurements it would leave them behind.
  if (entered || !worksheet.can["settings-checks"] || filledMode(editing.filled) === null) return null;
  return (
    <button
      type="button"
      onClick={onCheck}
      className={`${styles.check} min-h-[56px] w-[110px] rounded-[8px] px-3 text-left text-[16px] leading-tight font-[640] control max-[359px]:w-[98px] max-[359px]:px-2`}
    >
      Checked, unchanged
    </button>
  );
}
