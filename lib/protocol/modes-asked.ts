import type { VentilationMode } from "../physiology/modes";

/** V6: which volume a mode is judged on, and what is read beside it. */
export interface VolumePlan {
  base: "set" | "exhaled";
  beside: "exhaled" | "spontaneous" | null;
}

const volumePlans: Partial<Record<VentilationMode, VolumePlan>> = {
  "A/C-VC": { base: "set", beside: "exhaled" },
  "A/C-PC": { base: "exhaled", beside: null },
  "A/C-vtPC": { base: "exhaled", beside: null },
  "SIMV-VC-PS": { base: "set", beside: "spontaneous" },
  "SIMV-PC-PS": { base: "exhaled", beside: "spontaneous" },
  "CSV-PS": { base: "exhaled", beside: null },
  CPAP: { base: "exhaled", beside: null },
  // The release volume is charted as the exhaled one.
  APRV: { base: "exhaled", beside: null },
};

/** The mode's plan; null where volume is not asked (HFOV, NIV, HFNO). */
export function volumePlanOf(mode: VentilationMode): VolumePlan | null {
  return volumePlans[mode] ?? null;
}

const plateauModes: ReadonlySet<VentilationMode> = new Set([
  "A/C-VC",
  "A/C-PC",
  "A/C-vtPC",
  "SIMV-VC-PS",
  "SIMV-PC-PS",
]);

/** V9: modes that ask a plateau from their first settings on. */
export function asksPlateau(mode: VentilationMode): boolean {
  return plateauModes.has(mode);
}

/** V9: asked only once a relaxed hold was charted since the mode began. */
export function asksPlateauOnceHeld(mode: VentilationMode): boolean {
  return mode === "CSV-PS" || mode === "CPAP";
}

/** V9: only SpO2, gases and total rate are judged. */
export function isNonInvasive(mode: VentilationMode): boolean {
  return mode === "NIV" || mode === "HFNO";
}

/** V10: power is asked in assist-control only. */
export function asksPower(mode: VentilationMode): boolean {
  return mode === "A/C-VC" || mode === "A/C-PC" || mode === "A/C-vtPC";
}
