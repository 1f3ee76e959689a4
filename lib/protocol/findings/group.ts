import type { Evaluation, Group } from "../result";
import type { Scene } from "../scene";
import { worseOf, type Check } from "./checks";
import { stepsOut } from "./distance";

/** S3, S4: the worst check names the group; comfort or nothing asked is not judged, a pause is away. */
export function groupOf(scene: Scene, checks: readonly Check[]): Group {
  if (scene.clock.isAway(scene.at)) return "away";
  if (scene.comfort || checks.length === 0) return "not-judged";
  return checks.reduce(worseOf).says;
}

/** S4: the checks that decide the group, worst first; inside needs no cause. */
export function causesOf(group: Group, checks: readonly Check[]): Evaluation["causes"] {
  if (group === "inside") return [];
  const deciding = checks.filter(({ says }) => says === group);
  if (group === "outside") deciding.sort((a, b) => stepsOut(b.judged) - stepsOut(a.judged));
  return deciding.map(({ judged: { name, state, lastState } }) => ({ metric: name, state: state!, lastState }));
}
