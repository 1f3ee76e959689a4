import type { JudgedMetrics } from "../findings/checks";
import { foresee } from "../freshness";
import { isoOf } from "../instant";
import type { Judged } from "../judge/judged";
import type { Due } from "../result";
import type { Scene } from "../scene";
import { earliest } from "./earliest";
import { firstGasDueAt } from "./due-gas";
import { heightDueAt } from "./due-height";
import { holdDueAt } from "./due-hold";
import { settingsCheckDueAt } from "./due-settings-check";
import { spo2DueAt } from "./due-spo2";

/** F3: the earliest of what a gas answers; what the newest gases never held is not asked for again. */
function gasDue(scene: Scene, { ph, paco2MmHg, pao2MmHg }: JudgedMetrics): number | null {
  const asked = [ph, paco2MmHg, pao2MmHg].filter(({ state }) => state !== "not-asked");
  const measured = asked.filter(({ freshness }) => freshness !== "missing");
  const ordered = measured.filter(({ limit }) => limit !== null);
  const dues = (metrics: Judged[]) => earliest(...metrics.map(({ dueAt }) => dueAt));
  if (measured.length === 0) return asked.length === 0 ? null : firstGasDueAt(scene);
  return dues(ordered.length > 0 ? ordered : measured);
}

/** F2, F3: what is due or will be, earliest first. SpO2 is named only when overdue; away and comfort nothing is due. */
export function dueListOf(scene: Scene, metrics: JudgedMetrics): Due[] {
  if (scene.comfort || scene.ended || scene.clock.isAway(scene.at)) return [];
  const moments: [Due["what"], number | null][] = [
    ["height", heightDueAt(scene)],
    ["hold", holdDueAt(scene)],
    ["spo2", spo2DueAt(scene)],
    ["gas", gasDue(scene, metrics)],
    ["settings-check", settingsCheckDueAt(scene)],
  ];
  return moments
    .flatMap(([what, moment]) => {
      foresee(scene, moment);
      return moment === null ? [] : [{ what, moment, overdue: scene.at >= moment }];
    })
    .filter(({ what, overdue }) => what !== "spo2" || overdue)
    .sort((a, b) => a.moment - b.moment)
    .map(({ what, moment, overdue }) => ({ what, dueAt: isoOf(moment)!, overdue }));
}
