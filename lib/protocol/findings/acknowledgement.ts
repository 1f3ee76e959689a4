import { compareToLimit } from "../compare-to-limit";
import { earliest } from "../due/earliest";
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

/** A2: when it went one step further out than what was answered. */
function wentFurtherAt(judged: Judged, { t, fact }: Item<AcknowledgementFact>): number | null {
  const { limit } = judged;
  if (!limit || fact.value === null) return null;
  const answered = sideOf(fact.value, limit) === null ? 0 : (distanceTo(fact.value, limit) ?? 0);
  const step = stepOf(judged.name, judged.unit);
  const further = (excursion: Excursion) => compareToLimit(distanceTo(excursion.value, limit)! - answered, step) >= 0;
  return judged.excursionsAfter(t).find((excursion) => isTimely(excursion) && further(excursion))?.recordedAt ?? null;
}

/** A2: when a second metric went outside after the answer. */
function anotherWentOutAt(metrics: JudgedMetrics, judged: Judged, t: number): number | null {
  const own = checkOfMetric[judged.name];
  const others = Object.values(metrics).filter((other) => {
    const check = checkOfMetric[other.name];
    return check !== undefined && check !== own && other.limit !== null && other.state !== "not-asked";
  });
  const went = others.map(
    (other) =>
      other.excursionsAfter(t).find((excursion) => excursion.starts && isTimely(excursion))?.recordedAt ?? null,
  );
  return earliest(...went);
}

function newestFor(scene: Scene, metric: DerivedName): Item<AcknowledgementFact> | null {
  const { acknowledgements } = scene.line;
  for (let index = countUntil(acknowledgements, scene.at) - 1; index >= 0; index--) {
    if (acknowledgements[index]!.fact.metric === metric) return acknowledgements[index]!;
  }
  return null;
}

/** What answers a finding now; `endedAt`: when the newest answer stopped keeping it quiet. */
export interface Answer {
  fact: AcknowledgementFact | null;
  until: number | null;
  endedAt: number | null;
}

const unanswered: Answer = { fact: null, until: null, endedAt: null };

/**
 * A2: the acknowledgement in force for a metric. It ends with its time, when the metric goes one step further out, and
 * when a second metric goes outside.
 */
export function answerTo(scene: Scene, metrics: JudgedMetrics, judged: Judged): Answer {
  const newest = newestFor(scene, judged.name);
  if (!newest) return unanswered;
  const until = quietUntil(judged, newest);
  const returned = earliest(wentFurtherAt(judged, newest), anotherWentOutAt(metrics, judged, newest.t));
  if (returned !== null) return { ...unanswered, endedAt: Math.min(returned, until) };
  if (scene.at >= until) return { ...unanswered, endedAt: until };
  foresee(scene, until);
  return { fact: newest.fact, until, endedAt: null };
}
