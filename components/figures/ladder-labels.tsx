import type { LadderMetrics } from "./ladder-metrics";
import { percent } from "./ladder-rails";
import { alongLadder } from "./ladder-reading";
import type { Rung } from "./ladder-rungs";

/** Millilitres under each rung, bold inside the order, and mL/kg below them. */
export function LadderLabels({ metrics, rungs }: { metrics: LadderMetrics; rungs: Rung[] }) {
  return (
    <g textAnchor="middle">
      {rungs
        .filter((rung) => rung.labelled)
        .map((rung) => (
          <g key={rung.mlPerKg} data-label={rung.mlPerKg}>
            <text
              x={percent(alongLadder(rung.mlPerKg))}
              y={metrics.mlBaseline}
              fontSize={metrics.mlSize}
              fontWeight={rung.ordered ? 700 : 500}
              fill={rung.ordered ? "var(--ink)" : "var(--muted)"}
              className={metrics.flag ? "nums" : "nums max-[359px]:text-[14px]"}
            >
              {rung.ml}
            </text>
            <text
              x={percent(alongLadder(rung.mlPerKg))}
              y={metrics.perKgBaseline}
              fontSize="14"
              fill="var(--muted)"
              className="font-words"
            >
              {`${rung.mlPerKg}${metrics.perKgUnit}`}
            </text>
          </g>
        ))}
    </g>
  );
}
