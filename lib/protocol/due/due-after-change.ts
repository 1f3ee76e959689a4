import { minuteMs } from "../instant";
import type { Scene } from "../scene";

/**
 * F3: a change makes a result due a while after it. What was already due before the change stays due: a change never
 * makes an overdue measurement look on time.
 */
export function dueAfterChange(
  scene: Scene,
  regular: number | null,
  changedAt: number | null,
  delayMin: number,
): number | null {
  if (changedAt === null) return regular;
  if (regular !== null && regular <= changedAt) return regular;
  return scene.clock.after(changedAt, delayMin * minuteMs);
}

/** F3: after a pause hold, SpO2 and settings check are due on return, unless done since. */
export function dueOnReturn(scene: Scene, lastDone: number | null, due: number | null): number | null {
  const returned = scene.clock.returnedAt(scene.at);
  if (returned === null || (lastDone !== null && lastDone >= returned)) return due;
  return due === null ? returned : Math.min(due, returned);
}
