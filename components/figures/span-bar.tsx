import { barStack } from "./bar-stack";
import type { SpanMetrics } from "./span-metrics";
import type { SpanShape } from "./span-shape";

/** How far lip and block stand out beyond the column on each side, px. */
const overhang = 5;
const measures = {
  block: { gap: 2, lip: 10, leastBlock: 6 },
  lip: { gap: 2.5, lip: 10, leastBlock: 6 },
  none: { gap: 0, lip: 0, leastBlock: 0 },
};

interface SpanBarProps {
  metrics: SpanMetrics;
  shape: SpanShape;
  hatch: string;
}

/** The bar from low water to plateau: in one piece under its limit, with a lip on it, or broken by a gap above it. */
export function SpanBar({ metrics, shape, hatch }: SpanBarProps) {
  const { column } = metrics;
  const { bar, cap } = verticalStack(metrics, shape);
  const dashes = { strokeWidth: 1.6, strokeDasharray: "5 3.5", fill: hatch };
  return (
    <g>
      <rect
        data-part="bar"
        data-hatched={shape.hatched}
        x={column.left}
        width={column.right - column.left}
        y={bar.y}
        height={bar.height}
        {...(shape.hatched ? { ...dashes, stroke: "var(--unm)" } : { fill: "var(--accent)" })}
      />
      {cap && (
        <rect
          data-part={shape.mark.cap}
          data-hatched={shape.capHatched}
          x={column.left - overhang}
          width={column.right - column.left + 2 * overhang}
          y={cap.y}
          height={cap.height}
          {...(shape.capHatched
            ? { ...dashes, stroke: "var(--outside)" }
            : { fill: shape.mark.cap === "lip" ? "var(--edge-fill)" : "var(--outside)" })}
        />
      )}
    </g>
  );
}

/** Bar and cap as rectangles, top downward. */
export function verticalStack({ y }: SpanMetrics, { base, plateau, mark }: SpanShape) {
  const up = (cmH2O: number) => y(0) - y(cmH2O);
  const stack = barStack(
    { base: up(base), top: up(plateau), mark: mark.at === null ? null : up(mark.at), cap: mark.cap },
    measures[mark.cap],
  );
  const box = ([from, to]: [number, number]) => ({ y: y(0) - to, height: to - from });
  return { bar: box(stack.bar), cap: stack.cap && box(stack.cap) };
}
