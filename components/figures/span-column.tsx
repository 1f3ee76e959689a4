import { spanTopCmH2O, type SpanMetrics } from "./span-metrics";
import type { LowWater } from "./span-reading";

/** The empty column, 0 to 45 cmH2O, with the still water that PEEP holds. */
export function SpanColumn({ metrics, lowWater }: { metrics: SpanMetrics; lowWater: LowWater | null }) {
  const { column, y } = metrics;
  const width = column.right - column.left;
  const level = lowWater?.value ?? 0;
  const ripples = Array.from({ length: Math.ceil(Math.min(level, spanTopCmH2O) / 2.5) }, (_, index) => index * 2.5);
  return (
    <g>
      <rect
        data-part="column"
        x={column.left}
        y={y(spanTopCmH2O)}
        width={width}
        height={y(0) - y(spanTopCmH2O)}
        fill="var(--surface)"
        stroke="var(--hair)"
      />
      {lowWater && (
        <rect
          data-part="low-water"
          x={column.left}
          y={y(level)}
          width={width}
          height={y(0) - y(level)}
          fill="var(--accent-soft)"
        />
      )}
      {ripples.slice(1).map((cmH2O) => (
        <path key={cmH2O} d={`M${column.left + 8} ${y(cmH2O)}H${column.right - 8}`} stroke="var(--band)" />
      ))}
    </g>
  );
}
