import { minuteMs } from "../instant";
import type { Scene } from "../scene";

/** F2, V12: height and the sex used for PBW are due an hour after intubation; one charted as too short is charted. */
export function heightDueAt(scene: Scene): number | null {
  const { heightCm, sex } = scene.pbw;
  if (scene.intubatedAt === null || (heightCm !== null && sex !== null)) return null;
  return scene.clock.after(scene.intubatedAt, scene.policy.intervals.heightMin * minuteMs);
}
