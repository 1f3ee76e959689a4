import { isoOf } from "../instant";
import { isHeldOutside, type Judged } from "../judge/judged";
import type { Derived, DerivedName, Finding } from "../result";
import type { Scene } from "../scene";
import { answerTo, type Answer } from "./acknowledgement";
import type { JudgedMetrics } from "./checks";
import { distanceOf } from "./distance";
import { escalates, escalationClock } from "./escalation";

/** A1: metrics that an order may limit. */
const checked: readonly DerivedName[] = [
  "vtMlPerKg",
  "plateauCmH2O",
  "drivingPressureCmH2O",
  "intrinsicPeepCmH2O",
  "spo2Percent",
  "pao2MmHg",
  "paco2MmHg",
  "ph",
  "respiratoryRateTotal",
  "mechanicalPowerJPerMin",
];

/** A3: a paused patient's findings are not sent. */
function escalationOf(scene: Scene, metrics: JudgedMetrics, judged: Judged, answer: Answer): Finding["escalation"] {
  if (answer.fact || scene.clock.isAway(scene.at) || !escalates(scene, metrics, judged)) return null;
  const clock = escalationClock(scene, judged, answer.endedAt);
  return clock && { from: isoOf(clock.from)!, at: isoOf(clock.at) };
}

function presentAnswer({ fact, until }: Answer): Finding["acknowledgement"] {
  return fact && { by: fact.author, until: isoOf(until)!, note: fact.note };
}

function findingOf(scene: Scene, metrics: JudgedMetrics, judged: Judged, shown: Derived): Finding {
  const outside = (judged.state === "outside" || isHeldOutside(judged)) && !scene.comfort;
  const answer = outside ? answerTo(scene, metrics, judged) : null;
  const { value, lastState, lastValue, limit, since } = shown;
  return {
    metric: judged.name,
    state: judged.state ?? "unmeasured",
    value,
    lastState,
    lastValue,
    limit,
    distance: distanceOf(judged),
    freshness: judged.freshness,
    since,
    acknowledgement: answer && presentAnswer(answer),
    escalation: answer && escalationOf(scene, metrics, judged, answer),
  };
}

/** A1–A3: one finding for each metric that the order limits. */
export function findingsOf(
  scene: Scene,
  metrics: JudgedMetrics,
  derived: Readonly<Record<DerivedName, Derived>>,
): Finding[] {
  return checked
    .filter((name) => metrics[name].limit !== null)
    .map((name) => findingOf(scene, metrics, metrics[name], derived[name]));
}
