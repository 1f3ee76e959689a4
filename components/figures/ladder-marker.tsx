import type { Limit, State } from "@/lib/protocol/result";
import type { LadderMetrics } from "./ladder-metrics";
import { percent } from "./ladder-rails";
import { alongLadder, type LadderReading } from "./ladder-reading";

interface LadderMarkerProps {
  metrics: LadderMetrics;
  reading: LadderReading;
  order: Limit | null;
}

/** Disc between the rails; half disc on its limit; diamond tethered to the limit it is beyond; dashed ring unmeasured. */
export function LadderMarker({ metrics, reading, order }: LadderMarkerProps) {
  const y = (metrics.rails[0] + metrics.rails[1]) / 2;
  const at = alongLadder(reading.mlPerKg);
  const limit = reading.state === "outside" ? passedLimit(reading.mlPerKg, order) : null;
  return (
    <g>
      {limit !== null && (
        <line
          data-part="tether"
          x1={percent(alongLadder(limit))}
          x2={percent(at)}
          y1={y}
          y2={y}
          stroke="var(--outside)"
          strokeWidth="3.5"
        />
      )}
      <svg data-part="marker" x={percent(at)} y={y} overflow="visible">
        <MarkerShape state={reading.state} />
      </svg>
    </g>
  );
}

function MarkerShape({ state }: { state: State }) {
  const ring = { stroke: "var(--paper)", strokeWidth: 2.5 };
  switch (state) {
    case "outside":
      return <path data-shape="diamond" d="M0-12L12 0L0 12L-12 0Z" fill="var(--outside)" {...ring} />;
    case "edge":
      return (
        <g data-shape="half-disc">
          <circle r="10.2" fill="var(--paper)" />
          <circle r="8.5" fill="var(--paper)" stroke="var(--edge)" strokeWidth="2" />
          <path d="M0-9A9 9 0 0 0 0 9Z" fill="var(--edge)" />
        </g>
      );
    case "unmeasured":
      return (
        <circle
          data-shape="dashed-ring"
          r="8"
          fill="var(--paper)"
          stroke="var(--unm)"
          strokeWidth="2"
          strokeDasharray="3.6 2.6"
        />
      );
    case "inside":
      return <circle data-shape="disc" r="10.25" fill="var(--accent)" {...ring} />;
    case "not-asked":
      return <circle data-shape="open-disc" r="8" fill="var(--paper)" stroke="var(--muted)" strokeWidth="2" />;
  }
}

function passedLimit(mlPerKg: number, order: Limit | null): number | null {
  if (order?.max !== undefined && mlPerKg > order.max) return order.max;
  if (order?.min !== undefined && mlPerKg < order.min) return order.min;
  return null;
}
