import { useId } from "react";
import { describeSpan, hasLimitTick } from "./describe-span";
import { HatchPattern } from "./hatch";
import { MiniBar } from "./mini-bar";
import { MiniLabels } from "./mini-labels";
import { miniRows, miniScale, type MiniScale } from "./mini-scale";
import { MiniWithoutBar } from "./mini-without-bar";
import { spanTopCmH2O } from "./span-metrics";
import type { PressureSpanMiniProps } from "./span-reading";
import { spanShape, type SpanShape } from "./span-shape";

/** The pressure span of one row: 214 px for 0 to 45 cmH2O (190 on a phone), lying. The same words as the large one. */
export function PressureSpanMini(props: PressureSpanMiniProps) {
  const { size = "row", lowWater, reading, limits } = props;
  const hatchId = useId();
  const scale = miniScale(size === "phone" ? 190 : 214);
  const shape = spanShape(reading, lowWater, limits);
  return (
    <svg
      role="img"
      aria-label={describeSpan(props)}
      width={scale.width}
      height="42"
      viewBox={`0 0 ${scale.width} 42`}
      overflow="visible"
      className="shrink-0"
    >
      <defs>
        <HatchPattern id={hatchId} />
      </defs>
      {[0, 15, 30, spanTopCmH2O].map((cmH2O) => (
        <path key={cmH2O} d={`M${scale.x(cmH2O)} 1V29`} stroke="var(--grid)" strokeWidth="1.5" />
      ))}
      {shape && (
        <MiniBar
          scale={scale}
          shape={shape}
          reading={reading}
          peep={lowWater?.value ?? null}
          hatch={`url(#${hatchId})`}
        />
      )}
      {shape && <Whisker scale={scale} shape={shape} />}
      <MiniWithoutBar scale={scale} lowWater={lowWater} reading={reading} limit={limits.plateau} />
      {lowWater && <LowStrip to={scale.x(lowWater.value)} />}
      {hasLimitTick(reading) && limits.plateau !== null && <LimitTick x={scale.x(limits.plateau)} />}
      <MiniLabels scale={scale} lowWater={lowWater} reading={reading} limits={limits} />
    </svg>
  );
}

function LowStrip({ to }: { to: number }) {
  return (
    <g>
      <rect data-part="low-water" x="0" y={miniRows.barFoot - 5} width={to} height="5" fill="var(--band)" />
      <path data-part="peep-line" d={`M${to} 4V26.5`} stroke="var(--ink)" strokeWidth="1.5" />
    </g>
  );
}

function LimitTick({ x }: { x: number }) {
  return (
    <g data-part="limit">
      <path d={`M${x} 1V29`} stroke="var(--paper)" strokeWidth="4" />
      <path d={`M${x} 1V29`} stroke="var(--ink)" strokeWidth="2" />
    </g>
  );
}

function Whisker({ scale, shape }: { scale: MiniScale; shape: SpanShape }) {
  const { peak, plateau, peakHatched: hatched } = shape;
  if (peak === null || peak <= plateau) return null;
  const end = scale.x(peak);
  const y = miniRows.middle;
  const cap =
    peak > spanTopCmH2O ? `M${end - 5} ${y - 5}L${end} ${y}L${end - 5} ${y + 5}` : `M${end} ${y - 5}V${y + 5}`;
  return (
    <path
      data-part="whisker"
      data-hatched={hatched}
      d={`M${scale.x(plateau)} ${y}H${end}${cap}`}
      fill="none"
      stroke={hatched ? "var(--unm)" : "var(--ink)"}
      strokeWidth="1.5"
      strokeDasharray={hatched ? "3 2.5" : undefined}
    />
  );
}
