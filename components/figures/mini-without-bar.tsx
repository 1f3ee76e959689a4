import { miniRows, type MiniScale } from "./mini-scale";
import { pressureText } from "./pressure-text";
import type { LowWater, SpanReading } from "./span-reading";

interface MiniWithoutBarProps {
  scale: MiniScale;
  lowWater: LowWater | null;
  reading: SpanReading;
  /** cmH2O of the limit tick, which words stay clear of. */
  limit: number | null;
}

/** What a mode without a plateau shows in a row: an outline of support, one line, or words. */
export function MiniWithoutBar({ scale, lowWater, reading, limit }: MiniWithoutBarProps) {
  const from = lowWater?.value ?? 0;
  switch (reading.kind) {
    case "support":
      return (
        <g>
          <rect
            data-part="support"
            x={scale.x(from)}
            y={miniRows.barTop + 0.75}
            width={scale.x(from + reading.support) - scale.x(from)}
            height={miniRows.barHeight - 1.5}
            fill="none"
            stroke="var(--accent)"
            strokeWidth="1.5"
          />
          <Words x={scale.x(from + reading.support) + 7} words={`support ${pressureText(reading.support)}`} />
        </g>
      );
    case "line":
      return (
        <g>
          <path
            data-part="line"
            d={`M${scale.x(reading.value)} ${reading.state === "outside" ? 2 : 4}V${reading.state === "outside" ? 28 : 26}`}
            stroke={reading.state === "outside" ? "var(--outside)" : "var(--accent)"}
            strokeWidth={reading.state === "outside" ? 5 : 3}
          />
          <Words x={scale.x(reading.value) + 8} words={reading.word} />
        </g>
      );
    case "never":
      return <NoPlateau scale={scale} from={from} limit={limit} />;
    case "words":
      return <Words x={8} words={reading.words} />;
    default:
      return null;
  }
}

/** About 90 px hold all three words. */
function NoPlateau({ scale, from, limit }: { scale: MiniScale; from: number; limit: number | null }) {
  const x = scale.x(from) + 10;
  const room = (limit === null ? scale.width : scale.x(limit)) - x;
  return <Words x={x} words={room < 90 ? "no plateau" : "no plateau yet"} unmeasured />;
}

function Words({ x, words, unmeasured = false }: { x: number; words: string; unmeasured?: boolean }) {
  return (
    <text
      x={x}
      y={miniRows.middle + 5}
      fontSize="14"
      fill={unmeasured ? "var(--unm)" : "var(--muted)"}
      className="font-words"
    >
      {words}
    </text>
  );
}
