import { pressureText } from "./pressure-text";
import type { SpanMetrics } from "./span-metrics";
import type { LowWater, SpanReading } from "./span-reading";
import { SvgNumber } from "./svg-number";

interface SpanLineProps {
  metrics: SpanMetrics;
  lowWater: LowWater | null;
  reading: SpanReading;
}

/** What a mode without a plateau shows in the column: an outline of support, one line, or words. */
export function SpanWithoutBar({ metrics, lowWater, reading }: SpanLineProps) {
  switch (reading.kind) {
    case "support":
      return <SupportOutline metrics={metrics} from={lowWater?.value ?? 0} support={reading.support} />;
    case "line":
      return <PressureLine metrics={metrics} value={reading.value} outside={reading.state === "outside"} />;
    case "never":
      return <ColumnWords metrics={metrics} words="no plateau yet" at={(lowWater?.value ?? 0) + 5} unmeasured />;
    case "words":
      return <ColumnWords metrics={metrics} words={reading.words} at={15} />;
    default:
      return null;
  }
}

function SupportOutline({ metrics, from, support }: { metrics: SpanMetrics; from: number; support: number }) {
  const { column, y } = metrics;
  const [top, bottom] = [y(from + support), y(from)];
  const middle = (top + bottom) / 2;
  const inside = bottom - top >= 66;
  return (
    <g>
      <rect
        data-part="support"
        x={column.left + 0.75}
        y={top}
        width={column.right - column.left - 1.5}
        height={bottom - top}
        fill="none"
        stroke="var(--accent)"
        strokeWidth="1.5"
      />
      <SvgNumber
        x={column.middle}
        y={inside ? middle + 4 : top - 30}
        text={pressureText(support)}
        textAnchor="middle"
        fontSize="30"
        fontWeight="700"
        fill="var(--ink)"
      />
      <text
        x={column.middle}
        y={inside ? middle + 22 : top - 11}
        textAnchor="middle"
        fontSize="15"
        fill="var(--muted)"
        className="font-words"
      >
        support
      </text>
    </g>
  );
}

/** Outside, the line stands out beyond the column on both sides, as the block of a bar does. */
function PressureLine({ metrics, value, outside }: { metrics: SpanMetrics; value: number; outside: boolean }) {
  const { column, y } = metrics;
  const overhang = outside ? 5 : 0;
  return (
    <path
      data-part="line"
      d={`M${column.left - overhang} ${y(value)}H${column.right + Math.max(8, overhang)}`}
      stroke={outside ? "var(--outside)" : "var(--accent)"}
      strokeWidth={outside ? 6 : 3}
    />
  );
}

function ColumnWords(props: { metrics: SpanMetrics; words: string; at: number; unmeasured?: boolean }) {
  const { metrics, words, at, unmeasured = false } = props;
  const lines = wrapped(words, 10);
  return (
    <text
      fontSize="15"
      fontWeight="560"
      fill={unmeasured ? "var(--unm)" : "var(--muted)"}
      textAnchor="middle"
      className="font-words"
    >
      {lines.map((line, index) => (
        <tspan
          key={line}
          x={metrics.column.middle}
          y={metrics.y(at) - (lines.length - 1 - index) * 18}
        >{`${line} `}</tspan>
      ))}
    </text>
  );
}

/** Words broken into lines of at most `most` characters where they allow it. */
function wrapped(words: string, most: number): string[] {
  return words.split(" ").reduce<string[]>((lines, word) => {
    const last = lines.at(-1);
    if (last === undefined || `${last} ${word}`.length > most) return [...lines, word];
    return [...lines.slice(0, -1), `${last} ${word}`];
  }, []);
}
