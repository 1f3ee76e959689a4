import type { FreshnessWord } from "@/lib/protocol/result";

export interface FreshnessProps {
  freshness: FreshnessWord;
  /** Age of the value, in words ('2 h 10'). */
  age?: string;
  /** 'HH:MM' of the change that expired it, or since which it is due. */
  since?: string;
  /** What kind of change: 'since the change at 14:20', 'since the turn at 18:30'. */
  changedBy?: "change" | "turn" | "therapy" | "event";
  /** What a stale result waits for: 'needs plateau'. */
  needs?: string;
  /** The last value in words, with its unit and time ('26 cmH2O at 22:15'). */
  was?: string;
  /** Two parts for a narrow cell, else the whole sentence. */
  narrow?: boolean;
}

/** How fresh a value is, in words: an age, when it fell due, or since when and why it is not measured. */
export function Freshness(props: FreshnessProps) {
  const { freshness, age, since } = props;
  if (freshness === "current") return <span className="t-label whitespace-nowrap text-muted">{age}</span>;
  if (freshness === "due") {
    return (
      <span className="t-label whitespace-nowrap text-muted">
        <b className="font-[640] text-ink">{since ? `due since ${since}` : "due"}</b>
        {age && `, ${age}`}
      </span>
    );
  }
  return <NotMeasured {...props} />;
}

function NotMeasured(props: FreshnessProps) {
  const chip = "t-state whitespace-nowrap text-unm bg-unm-soft chip";
  if (!props.narrow) return <span className={chip}>{freshnessSentence(props)}</span>;
  return (
    <span className="inline-flex flex-wrap items-baseline gap-x-2">
      <span className={chip}>not measured</span>{" "}
      <span className="t-label whitespace-nowrap text-unm">{reason(props, true)}</span>
    </span>
  );
}

/** 'not measured since the change at 14:20': the same words for a sentence or a text alternative. */
export function freshnessSentence(props: FreshnessProps): string {
  const { freshness, age, since, was } = props;
  if (freshness === "current") return age ? `${age} ago` : "current";
  if (freshness === "due") return since ? `due since ${since}` : "due";
  const why = reason(props, false);
  const words = why === "" ? "not measured" : why.startsWith("since") ? `not measured ${why}` : `not measured, ${why}`;
  return was && freshness !== "lapsed" ? `${words}, was ${was}` : words;
}

const changeWords = { change: "change", turn: "turn", therapy: "change", event: "event" };

function reason({ freshness, age, since, changedBy = "change", needs, was }: FreshnessProps, narrow: boolean): string {
  if (needs !== undefined) return `needs ${needs}`;
  switch (freshness) {
    case "changed-since":
      if (since === undefined) return "since the change";
      return narrow && changedBy === "change" ? `since ${since}` : `since the ${changeWords[changedBy]} at ${since}`;
    case "lapsed":
      return [was && `was ${was}`, age && `${age} ago`].filter(Boolean).join(", ");
    case "too-soon":
      return since === undefined ? "too soon" : `too soon after ${since}`;
    default:
      return "never";
  }
}
