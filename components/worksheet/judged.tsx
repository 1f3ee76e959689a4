import { RangeTrack } from "@/components/figures/range-track";
import { StateWord } from "@/components/figures/state-word";
import type { TrackMetric } from "@/components/figures/track-domain";
import type { Derived } from "@/lib/contracts";

type JudgedProps = Pick<Derived, "value" | "lastValue" | "lastState" | "limit"> & {
  metric: TrackMetric;
  name: string;
  state: NonNullable<Derived["state"]>;
  /** Of the track, px: below 1200, and from there on. */
  widths: readonly [number, number];
};

/** A number against its limits: track, then word. The word stands in a slot of its own so that tracks line up. */
export function Judged({ widths: [narrow, wide], ...track }: JudgedProps) {
  if (!track.limit || track.state === "not-asked") return null;
  return (
    <span className="ml-auto flex items-center gap-3">
      <span className="desk:hidden">
        <RangeTrack {...track} limit={track.limit} width={narrow} />
      </span>
      <span className="max-desk:hidden">
        <RangeTrack {...track} limit={track.limit} width={wide} />
      </span>
      <span className="w-[86px]">
        <StateWord state={track.state} />
      </span>
    </span>
  );
}
