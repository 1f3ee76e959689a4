import { pressureText } from "./pressure-text";
import { verticalStack } from "./span-bar";
import type { SpanMetrics } from "./span-metrics";
import type { SpanReading } from "./span-reading";
import type { SpanShape } from "./span-shape";
import { SvgNumber } from "./svg-number";

const plateLine = 19;
const wordLine = 16;

interface InscriptionProps {
  metrics: SpanMetrics;
  shape: SpanShape;
  reading: SpanReading;
}

/** What stands written in the bar: the driving pressure, or on a plate why there is none. */
export function SpanInscription({ metrics, shape, reading }: InscriptionProps) {
  const { bar } = verticalStack(metrics, shape);
  if (reading.kind === "measured") {
    return (
      <DrivingPressure metrics={metrics} middle={bar.y + bar.height / 2} room={bar.height} value={reading.driving} />
    );
  }
  return <Plate metrics={metrics} middle={bar.y + bar.height / 2} room={bar.height} lines={plateLines(reading)} />;
}

function plateLines(reading: SpanReading): string[] {
  switch (reading.kind) {
    case "unmeasured":
      return ["not", "measured", ...(reading.driving === null ? [] : [`was ${pressureText(reading.driving)}`])];
    case "draft":
      return ["say how", "the hold", "was"];
    case "effort":
      return [reading.hold === "effort" ? "effort:" : "not sure:", "repeat", "relaxed"];
    default:
      return [];
  }
}

function DrivingPressure(props: { metrics: SpanMetrics; middle: number; room: number; value: number }) {
  const { metrics, middle, room, value } = props;
  const { column } = metrics;
  const text = pressureText(value);
  // Four characters (14.7) are as wide as the column at full size.
  const numberSize = metrics.numberSize * (text.length > 3 ? 0.74 : 1);
  const words = room >= numberSize + 2 * wordLine + 4 ? ["driving", "pressure"] : [];
  const size = Math.min(numberSize, room - 6);
  const height = size * 0.7 + (words.length > 0 ? words.length * wordLine + 10 : 0);
  const top = middle - height / 2;
  const beside = size < 15;
  return (
    <g data-part="driving-pressure">
      <SvgNumber
        x={beside ? column.left - 6 : column.middle}
        y={beside ? middle + 6 : top + size * 0.7}
        text={text}
        textAnchor={beside ? "end" : "middle"}
        fontSize={beside ? 17 : size}
        fontWeight="700"
        fill={beside ? "var(--accent)" : "var(--on-accent)"}
      />
      {words.map((word, index) => (
        <text
          key={word}
          x={column.middle}
          y={top + size * 0.7 + 22 + index * wordLine}
          textAnchor="middle"
          fontSize="15"
          fontWeight="560"
          fill="var(--on-accent)"
          className="font-words"
        >
          {word}
        </text>
      ))}
    </g>
  );
}

function Plate(props: { metrics: SpanMetrics; middle: number; room: number; lines: string[] }) {
  const { metrics, middle, room, lines } = props;
  const fitting = room >= lines.length * plateLine + 4 ? lines : lines.slice(-1);
  const height = fitting.length * plateLine + 4;
  const width = metrics.column.right - metrics.column.left - 10;
  if (room < height) return null;
  return (
    <g data-part="plate">
      <rect
        x={metrics.column.middle - width / 2}
        y={middle - height / 2}
        width={width}
        height={height}
        fill="var(--unm-soft)"
      />
      {fitting.map((line, index) => (
        <text
          key={line}
          x={metrics.column.middle}
          y={middle - height / 2 + 15.5 + index * plateLine}
          textAnchor="middle"
          fontSize="15"
          fontWeight={line.startsWith("was ") ? 400 : 640}
          fill="var(--unm)"
          className="font-words"
        >
          {line}
        </text>
      ))}
    </g>
  );
}
