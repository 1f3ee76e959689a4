"use client";

import { SideSheet } from "@/components/ui/side-sheet";
import { modeLabel, ventilationModes, type VentilationMode } from "@/lib/physiology";
import { filledMode } from "./filled";
import { useRecord } from "./use-record";

const kinds: Record<VentilationMode, string> = {
  "A/C-VC": "assist/control, volume",
  "A/C-PC": "assist/control, pressure",
  "A/C-vtPC": "assist/control, pressure with a volume target",
  "SIMV-VC-PS": "intermittent mandatory, volume",
  "SIMV-PC-PS": "intermittent mandatory, pressure",
  "CSV-PS": "spontaneous, pressure support",
  CPAP: "spontaneous, one pressure",
  APRV: "two pressures, release",
  HFOV: "oscillation",
  NIV: "by mask",
  HFNO: "high-flow nasal oxygen",
};

/** The mode's own settings replace the rows; a changed mode is charted with all of them. */
export function ModeSheet({ open, onClose }: { open: boolean; onClose: () => void }) {
  const { editing, mode } = useRecord();
  const choose = (chosen: VentilationMode) => {
    editing.set("mode", chosen === filledMode(editing.filled) ? null : chosen);
    onClose();
  };
  return (
    <SideSheet open={open} onClose={onClose} title="Mode">
      <ul className="grid gap-2">
        {ventilationModes.map((each) => (
          <li key={each}>
            <button
              type="button"
              aria-pressed={each === mode}
              onClick={() => choose(each)}
              className={`flex min-h-14 w-full items-center justify-between gap-4 rounded-[8px] px-4 text-left ${each === mode ? "border-[2.5px] border-accent bg-accent-soft" : "control"}`}
            >
              <b className="text-[18px] font-[680] whitespace-nowrap">{modeLabel(each)}</b>
              <span className="t-small text-muted">{kinds[each]}</span>
            </button>
          </li>
        ))}
      </ul>
    </SideSheet>
  );
}
