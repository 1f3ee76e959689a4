import { millisecondsOf, minuteMs } from "../instant";
import { isHeldOutside, type Judged } from "../judge/judged";
import type { Scene } from "../scene";
import { escalateAfterMin } from "../unit-policy-defaults";
import { oxygenChecks, type JudgedMetrics } from "./checks";
import { sideOut } from "./distance";

/** A3: VT, plateau, ΔP above (VT not in CSV-PS and CPAP); SpO2, PaO2 below; pH outside; trapped gas above its limit. */
export function escalates(scene: Scene, metrics: JudgedMetrics, judged: Judged): boolean {
  if (judged.state !== "outside" && !isHeldOutside(judged)) return false;
  const side = sideOut(judged);
  switch (judged.name) {
    case "vtMlPerKg":
      return side === "above" && scene.mode !== "CSV-PS" && scene.mode !== "CPAP";
    case "plateauCmH2O":
    case "drivingPressureCmH2O":
    case "intrinsicPeepCmH2O":
      return side === "above";
    case "spo2Percent":
    case "pao2MmHg":
      return side === "below" && oxygenChecks(scene, metrics).some((check) => check.judged === judged);
    case "ph":
      return true;
    default:
      return false;
  }
}

/**
 * A3: from when an unanswered finding counts: the later of its reading's and the order's `recordedAt`; a return from a
 * pause starts it anew, and so does the end of an answer. `at` is when it is sent.
 */
export function escalationClock(
  scene: Scene,
  judged: Judged,
  quietEnded: number | null,
): { from: number; at: number | null } | null {
  if (!judged.run) return null;
  const ordered = scene.targets.recordedAt;
  const from = Math.max(
    judged.run.recordedFrom,
    ordered === undefined || ordered === null ? -Infinity : millisecondsOf(ordered),
    scene.clock.returnedAt(scene.at) ?? -Infinity,
    quietEnded ?? -Infinity,
  );
  return { from, at: scene.clock.after(from, escalateAfterMin * minuteMs) };
}
