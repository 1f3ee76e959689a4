import type { HistoryOf } from "@/components/history/history-of";
import type { Worksheet } from "@/lib/contracts";
import { clockTime, displayNumber, timeOfDay } from "@/lib/format";
import { modeLabel, ventilationModes, type VentilationMode } from "@/lib/physiology";
import { ColumnHead } from "./column-head";
import { settingRows } from "./rows";
import { SheetCell, SheetNumber } from "./sheet-cell";

interface SetColumnProps {
  sheet: Worksheet;
  onHistory: (of: HistoryOf) => void;
}

/** What the ventilator is set to, and since when each value has stood. */
export function SetColumn({ sheet, onHistory }: SetColumnProps) {
  const { settings, unit, can, patient } = sheet;
  const mode = modeOf(sheet);
  const rows = settingRows(mode, (field) => settings?.[field] !== undefined);
  return (
    <section aria-label="Set">
      <ColumnHead title="Set" aside={settingsStand(sheet)} />
      {rows.length === 0 && <p className="py-4 t-body text-muted">No settings charted yet.</p>}
      {rows.map(({ field, label, unit: unitWords, decimals }) => {
        const value = settings?.[field]?.value;
        const href = can.settingsFields.includes(field) ? `/patients/${patient.id}/record?focus=${field}` : undefined;
        return (
          <SheetCell
            key={field}
            label={flowLabel(field, label, sheet)}
            href={href}
            opens={`opens the entry form at ${label}`}
          >
            {typeof value === "number" ? (
              <SheetNumber text={writeSetting(value, decimals)} unit={unitWords} />
            ) : (
              <span className="t-body text-muted">not charted</span>
            )}
          </SheetCell>
        );
      })}
      {settings && <SettingsCheck sheet={sheet} timeZone={unit.timeZone} />}
      {settings && (
        <button
          type="button"
          aria-haspopup="dialog"
          className="min-h-[44px] t-state text-accent underline"
          onClick={() => onHistory({ label: "settings", kind: "settings" })}
        >
          History of settings
        </button>
      )}
    </section>
  );
}

/** A set value keeps the decimals it was charted with. */
function writeSetting(value: number, decimals: number): string {
  const charted = String(value).split(".")[1]?.length ?? 0;
  return displayNumber({ value, decimals: Math.max(decimals, charted) });
}

function modeOf({ settings }: Worksheet): VentilationMode | null {
  return ventilationModes.find((mode) => mode === settings?.mode?.value) ?? null;
}

/** 'A/C-VC, 14:20': the mode, and when any setting last changed. */
function settingsStand(sheet: Worksheet): string {
  const mode = modeOf(sheet);
  if (!mode || !sheet.settings) return "";
  const newest = Object.values(sheet.settings)
    .map(({ chartedAt }) => Date.parse(chartedAt))
    .reduce((a, b) => Math.max(a, b));
  return `${modeLabel(mode)}, ${clockTime({ at: newest, now: sheet.at, timeZone: sheet.unit.timeZone })}`;
}

function flowLabel(field: string, label: string, { settings }: Worksheet): string {
  if (field !== "flowLPerMin") return label;
  const pattern = settings?.flowPattern?.value;
  if (pattern === "decelerating") return "Flow, descending";
  return pattern === "square" ? "Flow, constant" : label;
}

function SettingsCheck({ sheet, timeZone }: { sheet: Worksheet; timeZone: string }) {
  const due = sheet.due.find(({ what }) => what === "settings-check");
  const words = due ? `${due.overdue ? "overdue since" : "due"} ${timeOfDay({ at: due.dueAt, timeZone })}` : "not due";
  return (
    <SheetCell label="Settings check">
      <span className={`t-state ${due?.overdue ? "text-edge" : ""}`}>{words}</span>
    </SheetCell>
  );
}
