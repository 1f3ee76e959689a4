"use client";

import { timeOfDay } from "@/lib/format";
import type { NumericSettingField } from "@/lib/physiology";
import { Button } from "@/components/ui/button";
import { ColumnHead } from "@/components/worksheet/column-head";
import { settingRowsOf } from "./form-fields";
import styles from "./record.module.css";
import { SettingRow } from "./setting-row";
import { useRecord } from "./use-record";

/** The settings of the mode, as far as this person may chart them. */
export function SettingsPart({ onMode }: { onMode: () => void }) {
  const { mode, worksheet } = useRecord();
  const { can } = worksheet;
  if (can.settingsFields.length === 0) return null;
  const rows: NumericSettingField[] = mode
    ? settingRowsOf(mode).filter((field) => can.settingsFields.includes(field))
    : [];
  return (
    <section aria-label="Settings" className={`${styles.set} px-4 tablet:px-0`}>
      <div className="max-tablet:sr-only">
        <ColumnHead title="Set" aside={lastCharted(worksheet)} />
      </div>
      {!mode && <FirstMode onMode={can.settingsFields.includes("mode") ? onMode : null} />}
      {rows.map((field) => (
        <SettingRow key={field} field={field} />
      ))}
    </section>
  );
}

function lastCharted({ settings, unit }: ReturnType<typeof useRecord>["worksheet"]): string {
  const times = Object.values(settings ?? {}).map(({ chartedAt }) => Date.parse(chartedAt));
  if (times.length === 0) return "nothing charted";
  return `last charted ${timeOfDay({ at: Math.max(...times), timeZone: unit.timeZone })}`;
}

function FirstMode({ onMode }: { onMode: (() => void) | null }) {
  return (
    <div className="flex flex-wrap items-center gap-4 py-4">
      <p className="t-body">No settings were in force at this time.</p>
      {onMode && (
        <Button size="entry" look="primary" onClick={onMode}>
          Choose a mode
        </Button>
      )}
    </div>
  );
}
