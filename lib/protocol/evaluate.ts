import { dueListOf } from "./due/due-list";
import { groupChecks } from "./findings/checks";
import { findingsOf } from "./findings/findings";
import { causesOf, groupOf } from "./findings/group";
import { rankOf } from "./findings/rank";
import { judgeAll } from "./judge-all";
import { measuredFreshness } from "./measured-freshness";
import { present } from "./judge/present";
import { derivedNames, type Derived, type DerivedName, type Evaluation } from "./result";
import { sceneOf, type EvaluateInput } from "./scene";
import { validUntilOf } from "./valid-until";

/**
 * Targets, unit policy, episode and facts at a moment: every number with its judgement, the findings, what is due, the
 * bed's group and why. Pure: holds no clock, mutates nothing, and never throws on facts that may be charted (V14).
 * Facts are folded once per facts object, which is taken as immutable. Rules V, F, S, A; next steps are empty yet.
 */
export function evaluate(input: EvaluateInput): Evaluation {
  const scene = sceneOf(input);
  const metrics = judgeAll(scene);
  const checks = groupChecks(scene, metrics);
  const group = groupOf(scene, checks);
  const derived = {} as Record<DerivedName, Derived>;
  for (const name of derivedNames) derived[name] = present(scene, metrics[name]);
  const findings = findingsOf(scene, metrics, derived);
  const due = dueListOf(scene, metrics);
  return {
    derived,
    findings,
    nextSteps: [],
    due,
    measured: measuredFreshness(scene),
    group,
    causes: causesOf(group, checks),
    rank: rankOf(group, checks, findings, due),
    validUntil: validUntilOf(scene),
  };
}
