import type { Limit, State } from "@/lib/protocol/result";
import { flagWords } from "./describe-ladder";
import type { LadderMetrics } from "./ladder-metrics";
import { percent } from "./ladder-rails";
import { alongLadder, type LadderReading } from "./ladder-reading";

interface LadderFlagProps {
  metrics: LadderMetrics;
  reading: LadderReading;
  order: Limit | null;
  note?: string;
}

const fills: Record<State, string> = {
  inside: "var(--accent)",
  edge: "var(--edge)",
  outside: "var(--outside)",
  unmeasured: "var(--unm)",
  "not-asked": "var(--muted)",
};

const flagHeight = 29;
/** Mean advance of the words face at 17/640, px a character; the flag's words are digits, 'mL/kg' and one word. */
const pxPerCharacter = 8.3;

/** The true number over the marker, even where the marker stops at the rail's end. */
export function LadderFlag({ metrics, reading, order, note }: LadderFlagProps) {
  const words = flagWords(reading, order);
  const width = words.length * pxPerCharacter + 20;
  const share = alongLadder(reading.mlPerKg);
  const left = flagLeft({ share, width, leastWidth: metrics.leastWidth, inset: metrics.inset });
  const tip = metrics.rails[0] + 1;
  const noteRight = share < 0.5;
  return (
    <svg x={percent(share)} overflow="visible" data-part="flag" data-left={left} data-width={width}>
      <rect x={left} y="0" width={width} height={flagHeight} rx="4" fill={fills[reading.state]} />
      <path d={`M-8 ${flagHeight - 1}H8L0 ${tip}Z`} fill={fills[reading.state]} />
      <text
        x={left + width / 2}
        y="20.5"
        textAnchor="middle"
        fontSize="17"
        fontWeight="640"
        fill="var(--on-state)"
        className="font-words"
      >
        {words}
      </text>
      {note !== undefined && (
        <text
          x={noteRight ? left + width + 14 : left - 14}
          y="20"
          textAnchor={noteRight ? "start" : "end"}
          fontSize="14"
          fill="var(--unm)"
          className="font-words"
        >
          {note}
        </text>
      )}
    </svg>
  );
}

/**
 * The flag's left edge relative to the marker, px: centred on it, and near an end moved inward just enough to stay over
 * the ladder at the narrowest width it is drawn. The real width is the browser's affair, so the drawing needs no script.
 */
export function flagLeft(flag: { share: number; width: number; leastWidth: number; inset: number }): number {
  const { share, width, leastWidth, inset } = flag;
  const reach = Math.max(0, (width / 2 - inset) / leastWidth);
  if (share < reach) return -inset - share * leastWidth;
  if (1 - share < reach) return inset + (1 - share) * leastWidth - width;
  return -width / 2;
}
