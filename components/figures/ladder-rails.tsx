import type { LadderMetrics } from "./ladder-metrics";
import { alongLadder } from "./ladder-reading";
import type { Rung } from "./ladder-rungs";
import type { Limit } from "@/lib/protocol/result";

/** Share of the ladder as an SVG length: the drawing stretches, its words and lines do not. */
export function percent(share: number): string {
  return `${Math.round(share * 1e5) / 1e3}%`;
}

/** The two rails, the shaded order between them, and the rungs. */
export function LadderRails({ metrics, rungs, order }: { metrics: LadderMetrics; rungs: Rung[]; order: Limit | null }) {
  const [top, bottom] = metrics.rails;
  return (
    <g>
      {order !== null && <OrderedBand order={order} top={top} bottom={bottom} />}
      {[top, bottom].map((y) => (
        <g key={y} data-part="rail" stroke="var(--ink)" strokeWidth="2">
          <line x1={-metrics.run} x2="100%" y1={y} y2={y} />
          <svg x="100%" overflow="visible">
            <line x1="0" x2={metrics.run} y1={y} y2={y} />
          </svg>
        </g>
      ))}
      {rungs.map((rung) => (
        <line
          key={rung.mlPerKg}
          data-part={rung.limit ? "ordered-limit" : "rung"}
          data-ml-per-kg={rung.mlPerKg}
          x1={percent(alongLadder(rung.mlPerKg))}
          x2={percent(alongLadder(rung.mlPerKg))}
          y1={rung.limit ? top - 6 : top}
          y2={rung.limit ? bottom + 6 : bottom}
          stroke="var(--ink)"
          strokeWidth={rung.limit ? 3 : 1.5}
        />
      ))}
    </g>
  );
}

function OrderedBand({ order, top, bottom }: { order: Limit; top: number; bottom: number }) {
  const from = alongLadder(order.min ?? -Infinity);
  const to = alongLadder(order.max ?? Infinity);
  return (
    <rect
      data-part="band"
      x={percent(from)}
      width={percent(Math.max(0, to - from))}
      y={top}
      height={bottom - top}
      fill="var(--band)"
    />
  );
}
