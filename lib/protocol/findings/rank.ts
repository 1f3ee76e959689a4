import type { Due, Evaluation, Finding, Group } from "../result";
import { isHeldOutside } from "../judge/judged";
import type { Check } from "./checks";
import { stepsOut } from "./distance";

const isOut = ({ judged }: Check) => judged.state === "outside" || isHeldOutside(judged);

function tierOf(group: Group, checks: readonly Check[], findings: readonly Finding[]): number {
  if (group !== "outside") return 1;
  const out = new Set(checks.filter(isOut).map(({ judged }) => judged.name));
  const unanswered = findings.filter((finding) => out.has(finding.metric) && !finding.acknowledgement);
  if (unanswered.length === 0) return 2;
  return unanswered.some((finding) => finding.escalation) ? 0 : 1;
}

/** S4: within a group: unanswered that A3 escalates, other unanswered, answered last; then steps out, then overdue. */
export function rankOf(
  group: Group,
  checks: readonly Check[],
  findings: readonly Finding[],
  due: readonly Due[],
): NonNullable<Evaluation["rank"]> {
  return {
    tier: tierOf(group, checks, findings),
    steps: Math.max(0, ...checks.filter(isOut).map(({ judged }) => stepsOut(judged))),
    overdueSince: due.find(({ overdue }) => overdue)?.dueAt ?? null,
  };
}

const groupOrder: readonly Group[] = ["outside", "unmeasured", "edge", "inside", "not-judged", "away"];

/** S4: which of two beds needs a look first: negative for the first. */
export function compareBeds(a: Pick<Evaluation, "group" | "rank">, b: Pick<Evaluation, "group" | "rank">): number {
  const byGroup = groupOrder.indexOf(a.group) - groupOrder.indexOf(b.group);
  if (byGroup !== 0 || !a.rank || !b.rank) return byGroup;
  if (a.rank.tier !== b.rank.tier) return a.rank.tier - b.rank.tier;
  if (a.rank.steps !== b.rank.steps) return b.rank.steps - a.rank.steps;
  const since = ({ rank }: Pick<Evaluation, "rank">) => (rank?.overdueSince ? Date.parse(rank.overdueSince) : Infinity);
  return since(a) === since(b) ? 0 : since(a) - since(b);
}
