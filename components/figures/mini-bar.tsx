import { barStack, type BarStack } from "./bar-stack";
import { miniRows, type MiniScale } from "./mini-scale";
import { pressureText } from "./pressure-text";
import type { SpanReading } from "./span-reading";
import type { SpanShape } from "./span-shape";
import { SvgNumber } from "./svg-number";

const overhang = 3;
const measures = { gap: 2, lip: 5, leastBlock: 4 };

interface MiniBarProps {
  scale: MiniScale;
  shape: SpanShape;
  reading: SpanReading;
  /** The set PEEP, where it has moved into the hatched bar. */
  peep: number | null;
  hatch: string;
}

export function MiniBar({ scale, shape, reading, peep, hatch }: MiniBarProps) {
  const { bar, cap } = miniStack(scale, shape);
  const dashes = { strokeWidth: 1.5, strokeDasharray: "4 2.5", fill: hatch };
  return (
    <g>
      <rect
        data-part="bar"
        data-hatched={shape.hatched}
        x={bar[0]}
        width={bar[1] - bar[0]}
        y={miniRows.barTop}
        height={miniRows.barHeight}
        {...(shape.hatched ? { ...dashes, stroke: "var(--unm)" } : { fill: "var(--accent)" })}
      />
      {cap && (
        <rect
          data-part={shape.mark.cap}
          data-hatched={shape.capHatched}
          x={cap[0]}
          width={cap[1] - cap[0]}
          y={miniRows.barTop - overhang}
          height={miniRows.barHeight + 2 * overhang}
          {...(shape.capHatched
            ? { ...dashes, stroke: "var(--outside)" }
            : { fill: shape.mark.cap === "lip" ? "var(--edge-fill)" : "var(--outside)" })}
        />
      )}
      <Inscription reading={reading} from={Math.max(bar[0], peep === null ? 0 : scale.x(peep))} to={bar[1]} />
    </g>
  );
}

/** Bar and cap from left to right, px. */
function miniStack({ x }: MiniScale, { base, plateau, mark }: SpanShape): BarStack {
  const at = mark.at === null ? null : x(mark.at);
  return barStack({ base: x(base), top: x(plateau), mark: at, cap: mark.cap }, measures);
}

/** Narrower than this the number does not fit between the bar's ends, px. */
const leastRoom = 24;

function Inscription({ reading, from, to }: { reading: SpanReading; from: number; to: number }) {
  const middle = (from + to) / 2;
  if (reading.kind === "measured") {
    const above = to - from < leastRoom;
    return (
      <SvgNumber
        data-part="driving-pressure"
        x={middle}
        y={above ? 2 : 20.3}
        text={pressureText(reading.driving)}
        textAnchor="middle"
        fontSize="15"
        fontWeight="700"
        fill={above ? "var(--accent)" : "var(--on-accent)"}
      />
    );
  }
  const words = plateWords(reading);
  if (words === null) return null;
  const width = words.length * 6.6 + 4;
  const above = to - from < width;
  return (
    <g data-part="plate">
      {!above && <rect x={middle - width / 2} y="7.5" width={width} height="15" fill="var(--unm-soft)" />}
      <text
        x={middle}
        y={above ? 2 : 20}
        textAnchor="middle"
        fontSize="14"
        fontWeight="640"
        fill="var(--unm)"
        className="font-words"
      >
        {words}
      </text>
    </g>
  );
}

function plateWords(reading: SpanReading): string | null {
  if (reading.kind === "unmeasured") return reading.driving === null ? "was" : `was ${pressureText(reading.driving)}`;
  if (reading.kind === "draft") return "hold?";
  return reading.kind === "effort" ? "effort" : null;
}
