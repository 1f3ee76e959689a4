import { pressureText } from "./pressure-text";
import { spanTopCmH2O, type SpanMetrics } from "./span-metrics";
import { SvgNumber } from "./svg-number";

const numerals = [0, 15, 30, spanTopCmH2O];
const ticks = Array.from({ length: 10 }, (_, index) => index * 5);

/** Ticks each 5 and 15 cmH2O left of the column; the numeral at the limit takes the place of one beside it. */
export function SpanRuler({ metrics, limit }: { metrics: SpanMetrics; limit: number | null }) {
  const { column, y, pxPerCmH2O } = metrics;
  const isCovered = (cmH2O: number) => limit !== null && Math.abs(limit - cmH2O) * pxPerCmH2O < 18;
  const numeral = { x: column.left - 14, textAnchor: "end" } as const;
  return (
    <g data-part="ruler">
      {ticks.map((cmH2O) => (
        <path
          key={cmH2O}
          d={`M${column.left - (cmH2O % 15 === 0 ? 11 : 7)} ${y(cmH2O)}H${column.left - 1}`}
          stroke="var(--rule)"
          strokeWidth="1.5"
        />
      ))}
      {numerals
        .filter((cmH2O) => !isCovered(cmH2O))
        .map((cmH2O) => (
          <SvgNumber key={cmH2O} {...numeral} y={y(cmH2O) + 5} text={`${cmH2O}`} fontSize="15" fill="var(--muted)" />
        ))}
      {limit !== null && (
        <SvgNumber
          {...numeral}
          y={y(limit) + 6}
          text={pressureText(limit)}
          fontSize="17"
          fontWeight="700"
          fill="var(--ink)"
        />
      )}
    </g>
  );
}
