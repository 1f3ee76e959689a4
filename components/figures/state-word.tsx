import type { State } from "@/lib/protocol/result";
import { StateShape } from "./state-shape";

export interface StateWordProps {
  /** Null draws nothing: a number that nobody judges has no state. */
  state: State | null;
  /** Draws the shape before the word. */
  shape?: boolean;
  /** Last outside and not measured since: 'HH:MM' of the last value, in the unit's time. */
  lastOutsideAt?: string;
}

const words: Record<State, string> = {
  inside: "inside",
  edge: "at the edge",
  outside: "outside",
  unmeasured: "not measured",
  "not-asked": "not asked",
};

const looks: Record<State, string> = {
  inside: "t-state text-accent",
  edge: "t-state text-edge bg-edge-soft chip",
  outside: "t-state text-outside bg-outside-soft chip",
  unmeasured: "t-state text-unm bg-unm-soft chip",
  "not-asked": "t-small text-muted",
};

/** The word of a state, with its tint and, where asked, its shape. Colour only repeats what the word says. */
export function StateWord({ state, shape = false, lastOutsideAt }: StateWordProps) {
  if (state === null) return null;
  if (lastOutsideAt !== undefined) return <LastOutside at={lastOutsideAt} shape={shape} />;
  return (
    <span data-state={state} className={`inline-flex items-baseline gap-2 whitespace-nowrap ${looks[state]}`}>
      {shape && <StateShape state={state} />}
      <span>{words[state]}</span>
    </span>
  );
}

function LastOutside({ at, shape }: { at: string; shape: boolean }) {
  return (
    <span data-state="last-outside" className="inline-flex flex-wrap items-baseline t-state">
      <span className="inline-flex items-baseline gap-2 chip bg-outside-soft text-outside">
        {shape && <StateShape state="outside" lastOutside />}
        <span>outside at {at},</span>
      </span>{" "}
      <span className="chip bg-unm-soft text-unm">not measured since</span>
    </span>
  );
}

/** The same word as text, for a sentence or a text alternative. */
export function stateWord(state: State): string {
  return words[state];
}
