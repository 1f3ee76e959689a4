import type { VentilationMode } from "../physiology/modes";
import { activeClockOf, type ActiveClock } from "./active-clock";
import type { Facts, Instant } from "./facts";
import { millisecondsOf } from "./instant";
import { asksPlateau, asksPlateauOnceHeld } from "./modes-asked";
import { pbwOf, type Pbw } from "./pbw-of";
import { targetsFromSet } from "./starting-sets";
import type { EpisodeFacts, TargetCondition, Targets, UnitPolicy } from "./targets";
import { numberInForce, type Snapshot } from "./timeline/fold-settings";
import { newestUntil } from "./timeline/item";
import { timelineOf, type Timeline } from "./timeline/timeline";
import { policyOf, type Policy } from "./unit-policy-defaults";

export interface EvaluateInput {
  targets?: Targets | null;
  unit?: UnitPolicy | null;
  episode?: EpisodeFacts | null;
  facts?: Facts | null;
  at: Instant;
}

/** What one evaluation looks at: a moment, the order, the policy and the folded facts. */
export interface Scene {
  at: number;
  targets: Targets;
  policy: Policy;
  clock: ActiveClock;
  intubatedAt: number | null;
  line: Timeline;
  settings: Snapshot | null;
  mode: VentilationMode | null;
  pbw: Pbw;
  onEcmo: boolean;
  /** The episode has ended: nothing is due. */
  ended: boolean;
  /** O3: comfort: nothing judged, nothing due. */
  comfort: boolean;
  /** V9: a plateau is asked now. */
  asksPlateau: boolean;
  /** Moments ahead of `at` at which time alone changes something. */
  moments: number[];
}

/** V11: on ECMO is the charted therapy. */
function ecmoAt(line: Timeline, at: number): boolean {
  let on = false;
  for (const { t, fact } of line.therapies) {
    if (t > at) break;
    if (fact.therapy === "ecmo") on = fact.on ?? on;
  }
  return on;
}

function plateauAsked(line: Timeline, settings: Snapshot | null, at: number): boolean {
  if (!settings) return false;
  if (!asksPlateauOnceHeld(settings.mode)) return asksPlateau(settings.mode);
  return line.holds.some(({ t, quality }) => quality === "relaxed" && t >= settings.modeBegan && t <= at);
}

const noFacts: Facts = {};

export function sceneOf(input: EvaluateInput): Scene {
  const at = millisecondsOf(input.at);
  const facts = input.facts ?? noFacts;
  const line = timelineOf(facts);
  const settings = newestUntil(line.snapshots, at);
  const targets = input.targets ?? targetsFromSet("unit-default");
  const clock = activeClockOf(input.episode);
  const intubatedAt = input.episode?.intubatedAt;
  const endedAt = input.episode?.endedAt;
  return {
    at,
    targets,
    policy: policyOf(input.unit),
    clock,
    intubatedAt: intubatedAt === undefined || intubatedAt === null ? null : millisecondsOf(intubatedAt),
    line,
    settings,
    mode: settings?.mode ?? null,
    pbw: pbwOf(facts, at),
    onEcmo: ecmoAt(line, at),
    ended: endedAt !== undefined && endedAt !== null && millisecondsOf(endedAt) <= at,
    comfort: hasCondition(targets, "comfort"),
    asksPlateau: plateauAsked(line, settings, at),
    moments: [],
  };
}

/** O2: conditions are charted on the order, never guessed from numbers. */
export function hasCondition(targets: Targets, ...conditions: TargetCondition[]): boolean {
  return (targets.conditions ?? []).some((condition) => conditions.includes(condition));
}

export function settingsAt(scene: Scene, t: number): Snapshot | null {
  return newestUntil(scene.line.snapshots, t);
}

/** FiO2 in force as integer percent (S1). */
export function fio2PercentAt(scene: Scene, t: number): number | null {
  const fio2 = numberInForce(settingsAt(scene, t), "fio2");
  return fio2 === null ? null : Math.round(fio2 * 100);
}
