import type { PositionFact, TherapyFact } from "../facts";
import { changeKind as k, type Change } from "./change-kinds";
import type { Item } from "./item";

/** V2: turns. No position charted counts as supine; the head of the bed alone, or 'still supine', changes nothing. */
export function positionChanges(items: readonly Item<PositionFact>[]): Change[] {
  const changes: Change[] = [];
  let before: PositionFact["position"] = "supine";
  for (const { t, fact } of items) {
    const after = fact.position;
    if (!after || after === before) continue;
    const turns = after === "supine" || after === "prone" || before === "prone";
    changes.push({ t, kinds: k.position | (turns ? k.turn : 0), entryId: fact.id, by: "turn" });
    before = after;
  }
  return changes;
}

interface TherapyState {
  block: boolean;
  ecmo: boolean;
  sweep: number | null;
  flow: number | null;
}

function ecmoKinds(state: TherapyState, fact: TherapyFact): number {
  const on = fact.on ?? state.ecmo;
  let kinds = on === state.ecmo ? 0 : k.ecmo | (on ? k.ecmoOn : 0);
  const sweep = fact.sweepLPerMin ?? state.sweep;
  const flow = fact.bloodFlowLPerMin ?? state.flow;
  if (state.sweep !== null && sweep !== state.sweep) kinds |= k.ecmoSweep;
  if (state.flow !== null && flow !== state.flow) kinds |= k.ecmoFlow;
  Object.assign(state, on ? { ecmo: true, sweep, flow } : { ecmo: false, sweep: null, flow: null });
  return kinds;
}

function therapyKinds(state: TherapyState, fact: TherapyFact): number {
  switch (fact.therapy) {
    case "neuromuscular-block": {
      const on = fact.on ?? state.block;
      const kinds = on === state.block ? 0 : k.neuromuscularBlock;
      state.block = on;
      return kinds;
    }
    case "ecmo":
      return ecmoKinds(state, fact);
    case "recruitment":
      return k.recruitment;
    case "tube":
      return k.tube;
    case "event":
      return k.event;
    case "sbt":
      return 0;
  }
}

/** V2: changes of therapies; none charted counts as off. */
export function therapyChanges(items: readonly Item<TherapyFact>[]): Change[] {
  const changes: Change[] = [];
  const state: TherapyState = { block: false, ecmo: false, sweep: null, flow: null };
  for (const { t, fact } of items) {
    const kinds = therapyKinds(state, fact);
    const by = fact.therapy === "event" ? "event" : "therapy";
    if (kinds !== 0) changes.push({ t, kinds, entryId: fact.id, by });
  }
  return changes;
}
