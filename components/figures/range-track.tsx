import type { Limit } from "@/lib/protocol/result";
import { describeTrack } from "./describe-track";
import type { RangeTrackProps } from "./range-track-props";
import { trackDomains } from "./track-domain";
import { TrackMarker } from "./track-marker";

/** One value against its ordered range: a line over a fixed domain, the ordered band, a post at each limit, a marker. */
export function RangeTrack(props: RangeTrackProps) {
  const { metric, value, lastValue = null, state, lastState = null, limit, width = 72 } = props;
  const [from, to] = trackDomains[metric];
  const x = (at: number) => ((Math.min(Math.max(at, from), to) - from) / (to - from)) * width;
  const unmeasured = state === "unmeasured";
  const shown = unmeasured ? lastValue : value;
  const band = [x(limit.min ?? from), x(limit.max ?? to)] as const;
  return (
    <svg
      role="img"
      aria-label={describeTrack(props)}
      width={width}
      height="20"
      viewBox={`0 0 ${width} 20`}
      overflow="visible"
      className="shrink-0"
    >
      <path
        data-part="baseline"
        d={`M0 10H${width}`}
        stroke={unmeasured ? "var(--unm)" : "var(--rule)"}
        strokeWidth="1.5"
        strokeDasharray={unmeasured ? "3 3" : undefined}
      />
      <rect
        data-part="band"
        x={band[0]}
        y="6"
        width={Math.max(0, band[1] - band[0])}
        height="8"
        fill={unmeasured ? "var(--unm-line)" : "var(--band)"}
      />
      {unmeasured && <path d={`M0 10H${width}`} stroke="var(--unm)" strokeWidth="1.5" strokeDasharray="3 3" />}
      {[limit.min, limit.max].map(
        (post) =>
          post !== undefined &&
          post >= from &&
          post <= to && (
            <path key={post} data-part="post" d={`M${x(post)} 2V18`} stroke="var(--ink)" strokeWidth="1.5" />
          ),
      )}
      {shown !== null && state !== "not-asked" && (
        <TrackMarker x={x(shown)} nearestPost={nearestPost(shown, limit, x)} state={state} lastState={lastState} />
      )}
    </svg>
  );
}

/** The post a value is beyond, px; the tether runs from there. */
function nearestPost(value: number, { min, max }: Pick<Limit, "min" | "max">, x: (at: number) => number) {
  if (max !== undefined && value > max) return x(max);
  if (min !== undefined && value < min) return x(min);
  return null;
}
