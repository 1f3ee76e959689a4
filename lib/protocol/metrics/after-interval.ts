import { minuteMs } from "../instant";
import type { Scene } from "../scene";

/** F2: when a reading's interval ends, pauses left out. */
export function afterInterval(scene: Scene, t: number, intervalMin: number): number | null {
  return scene.clock.after(t, intervalMin * minuteMs);
}
