import { spanTopCmH2O, type SpanMetrics } from "./span-metrics";
import type { SpanShape } from "./span-shape";

/** From plateau to peak; beyond the ruler's end it loses its cap and points on. */
export function SpanWhisker({ metrics, shape }: { metrics: SpanMetrics; shape: SpanShape }) {
  const { peak, plateau, peakHatched: hatched } = shape;
  const { column, y } = metrics;
  if (peak === null || peak <= plateau) return null;
  const top = y(peak);
  const end =
    peak > spanTopCmH2O
      ? `M${column.middle - 7} ${top + 8}L${column.middle} ${top}L${column.middle + 7} ${top + 8}`
      : `M${column.middle - 14} ${top}H${column.middle + 14}`;
  return (
    <path
      data-part="whisker"
      data-hatched={hatched}
      d={`M${column.middle} ${y(plateau)}V${top}${end}`}
      fill="none"
      stroke={hatched ? "var(--unm)" : "var(--ink)"}
      strokeWidth="2"
      strokeDasharray={hatched ? "4 3" : undefined}
    />
  );
}

/** The ordered plateau limit across the column, with a halo of paper so that it shows on any fill. */
export function SpanLimit({ metrics, limit }: { metrics: SpanMetrics; limit: number }) {
  const { column, y } = metrics;
  const d = `M${column.left - 12} ${y(limit)}H${column.right + 8}`;
  return (
    <g data-part="limit">
      <path d={d} stroke="var(--paper)" strokeWidth="4.5" />
      <path d={d} stroke="var(--ink)" strokeWidth="2.5" />
    </g>
  );
}

/** A 1.5 px line of ink across the column and out to its label: PEEP and plateau, whose tints alone are too faint. */
export function SpanLevel(props: { metrics: SpanMetrics; cmH2O: number; part: string; hatched?: boolean }) {
  const { metrics, cmH2O, part, hatched = false } = props;
  const { column, y } = metrics;
  const from = part === "plateau-tick" ? column.right : column.left;
  return (
    <path
      data-part={part}
      d={`M${from} ${y(cmH2O)}H${column.right + 8}`}
      stroke={hatched ? "var(--unm)" : "var(--ink)"}
      strokeWidth="1.5"
    />
  );
}
