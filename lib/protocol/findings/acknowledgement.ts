import { compareToLimit } from "../compare-to-limit";
import type { AcknowledgementFact } from "../facts";
import { foresee } from "../freshness";
import { hourMs, millisecondsOf } from "../instant";
import type { Excursion, Judged } from "../judge/judged";
import type { DerivedName } from "../result";
import type { Scene } from "../scene";
import { distanceTo, sideOf } from "../state-of";
import type { Item } from "../timeline/item";
import { countUntil } from "../timeline/item";
import type { JudgedMetrics } from "./checks";
import { sideOut } from "./distance";
import { stepOf } from "./steps";

/** A2: longest quiet (h); a harmful side of oxygen, and pH, at most 1 h. Starting values, from memory. */
const longestQuietH = 4;
const longestQuietHarmfulH = 1;

/** Charted more than this long after it was true is late (h). */
const lateAfterH = 1;

/** S3: the checks that count as a second metric; SpO2 and PaO2 are one. */
const checkOfMetric: Partial<Record<DerivedName, string>> = {
  vtMlPerKg: "volume",
  plateauCmH2O: "plateau",
  drivingPressureCmH2O: "driving pressure",
  intrinsicPeepCmH2O: "trapped gas",
  spo2Percent: "oxygen",
  pao2MmHg: "oxygen",
  paco2MmHg: "PaCO2",
  ph: "pH",
};

/** A2: a late entry leaves an acknowledgement in force. */
const isTimely = ({ t, recordedAt }: Excursion) => recordedAt - t <= lateAfterH * hourMs;

function quietUntil(judged: Judged, { t, fact }: Item<AcknowledgementFact>): number {
  const oxygenBelow = checkOfMetric[judged.name] === "oxygen" && sideOut(judged) === "below";
  const hours = judged.name === "ph" || oxygenBelow ? longestQuietHarmfulH : longestQuietH;
  return Math.min(millisecondsOf(fact.until), t + hours * hourMs);
}

/** A2: one step further out than what was answered. */
function wentFurther(judged: Judged, { t, fact }: Item<AcknowledgementFact>): boolean {
  const { limit } = judged;
  if (!limit || fact.value === null) return false;
  const answered = sideOf(fact.value, limit) === null ? 0 : (distanceTo(fact.value, limit) ?? 0);
  const step = stepOf(judged.name, judged.unit);
  return judged
    .excursionsAfter(t)
    .some(
      (excursion) => isTimely(excursion) && compareToLimit(distanceTo(excursion.value, limit)! - answered, step) >= 0,
    );
}

/** A2: a second metric went outside after the answer. */
function anotherWentOut(metrics: JudgedMetrics, judged: Judged, t: number): boolean {
  const own = checkOfMetric[judged.name];
  return Object.values(metrics).some((other) => {
    const check = checkOfMetric[other.name];
    if (!check || check === own || !other.limit || other.state === "not-asked") return false;
    return other.excursionsAfter(t).some((excursion) => excursion.starts && isTimely(excursion));
  });
}

function newestFor(scene: Scene, metric: DerivedName): Item<AcknowledgementFact> | null {
  const { acknowledgements } = scene.line;
  for (let index = countUntil(acknowledgements, scene.at) - 1; index >= 0; index--) {
    if (acknowledgements[index]!.fact.metric === metric) return acknowledgements[index]!;
  }
  return null;
}

/** What answers a finding: the fact and until when it keeps quiet. */
export interface Answer {
  fact: AcknowledgementFact;
  until: number;
}

/**
 * A2: the acknowledgement in force for a metric. It ends with its time, when the metric goes one step further out, and
 * when a second metric goes outside.
 */
export function answerTo(scene: Scene, metrics: JudgedMetrics, judged: Judged): Answer | null {
  const newest = newestFor(scene, judged.name);
  if (!newest) return null;
  const until = quietUntil(judged, newest);
  if (scene.at >= until || wentFurther(judged, newest) || anotherWentOut(metrics, judged, newest.t)) return null;
  foresee(scene, until);
  return { fact: newest.fact, until };
}
