import { StateShape } from "@/components/figures/state-shape";
import type { BedRow } from "@/lib/contracts";

const words: Record<NonNullable<BedRow["state"]>, { word: string; look: string }> = {
  outside: { word: "outside", look: "text-outside" },
  unmeasured: { word: "not measured", look: "text-unm" },
  edge: { word: "at the edge", look: "text-edge" },
  inside: { word: "inside", look: "text-accent" },
  "not-judged": { word: "not judged", look: "text-muted" },
  away: { word: "away from the unit", look: "text-muted" },
};

/** A bed's group: shape, then word. Last outside and not measured since keeps the outside's word and a dashed shape. */
export function GroupWord({ group, lastOutside }: { group: BedRow["state"]; lastOutside: boolean }) {
  if (group === null) return null;
  const { word, look } = words[group];
  const shape = group === "not-judged" || group === "away" ? "not-asked" : group;
  return (
    <span className={`flex items-center gap-2 t-state ${look}`}>
      <StateShape state={shape} lastOutside={lastOutside} />
      {lastOutside ? "outside, not measured since" : word}
    </span>
  );
}
