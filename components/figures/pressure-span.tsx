import { useId } from "react";
import { describeSpan, hasLimitTick } from "./describe-span";
import { HatchPattern } from "./hatch";
import { SpanBar } from "./span-bar";
import { SpanColumn } from "./span-column";
import { SpanInscription } from "./span-inscription";
import { spanLabels } from "./span-label-lines";
import { SpanLabels } from "./span-labels";
import { SpanWithoutBar } from "./span-lines";
import { SpanLevel, SpanLimit, SpanWhisker } from "./span-marks";
import { spanMetrics } from "./span-metrics";
import type { PressureSpanProps } from "./span-reading";
import { SpanRuler } from "./span-ruler";
import { spanShape } from "./span-shape";

/**
 * The pressures of one breath on a ruler of 0 to 45 cmH2O: still water up to PEEP, a bar from there to the plateau, a
 * whisker to the peak, the ordered limit across. What is over the mark is a wider block above a gap, so that shape
 * alone tells it; what is not measured since is hatched and dashed and stands where it was measured.
 */
export function PressureSpan(props: PressureSpanProps) {
  const { size = "large", lowWater, reading, limits } = props;
  const hatchId = useId();
  const metrics = spanMetrics(size);
  const shape = spanShape(reading, lowWater, limits);
  const limit = hasLimitTick(reading) ? limits.plateau : null;
  return (
    <svg
      role="img"
      aria-label={describeSpan(props)}
      width={metrics.width}
      height={metrics.height}
      viewBox={`0 0 ${metrics.width} ${metrics.height}`}
      overflow="visible"
      className="shrink-0"
    >
      <defs>
        <HatchPattern id={hatchId} />
      </defs>
      <SpanRuler metrics={metrics} limit={limit} />
      <SpanColumn metrics={metrics} lowWater={lowWater} />
      {shape && <SpanBar metrics={metrics} shape={shape} hatch={`url(#${hatchId})`} />}
      {shape && <SpanWhisker metrics={metrics} shape={shape} />}
      {shape && (
        <SpanLevel
          metrics={metrics}
          cmH2O={shape.plateau}
          part="plateau-tick"
          hatched={reading.kind === "unmeasured"}
        />
      )}
      {lowWater && <SpanLevel metrics={metrics} cmH2O={lowWater.value} part="peep-line" />}
      {limit !== null && <SpanLimit metrics={metrics} limit={limit} />}
      {shape && <SpanInscription metrics={metrics} shape={shape} reading={reading} />}
      <SpanWithoutBar metrics={metrics} lowWater={lowWater} reading={reading} />
      <SpanLabels metrics={metrics} labels={spanLabels(props, metrics.pxPerCmH2O)} />
    </svg>
  );
}
