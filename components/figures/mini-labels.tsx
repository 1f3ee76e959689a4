import { miniRows, type MiniScale } from "./mini-scale";
import { pressureText } from "./pressure-text";
import type { LowWater, SpanLimits, SpanReading } from "./span-reading";
import { SvgNumber } from "./svg-number";

interface MiniLabelsProps {
  scale: MiniScale;
  lowWater: LowWater | null;
  reading: SpanReading;
  limits: SpanLimits;
}

/** PEEP and plateau under their edges, kept apart where the two stand close. */
export function MiniLabels({ scale, lowWater, reading, limits }: MiniLabelsProps) {
  const low = lowWater && pressureText(lowWater.value);
  const high = highNumber(reading, limits);
  const lowX = lowWater && scale.x(lowWater.value);
  const highX = high && scale.x(high.value);
  const apart = low && high ? spread(lowX ?? 0, highX ?? 0, (low.length + high.text.length) * 4.2 + 6) : 0;
  const shared = { y: miniRows.labelBaseline, textAnchor: "middle", fontSize: 14 } as const;
  return (
    <g>
      {low !== null && lowX !== null && (
        <SvgNumber {...shared} data-part="low-number" x={lowX - apart} text={low} fill="var(--muted)" />
      )}
      {high && highX !== null && (
        <SvgNumber
          {...shared}
          data-part="high-number"
          x={highX + apart}
          text={high.text}
          fontWeight="600"
          fill={high.unmeasured ? "var(--unm)" : "var(--ink)"}
        />
      )}
    </g>
  );
}

/** How far each of two centred numbers must move outward so that `need` px lie between their middles. */
function spread(low: number, high: number, need: number): number {
  return Math.max(0, (need - (high - low)) / 2);
}

function highNumber(reading: SpanReading, limits: SpanLimits) {
  if (reading.kind === "line") {
    return { value: reading.value, text: pressureText(reading.value, limits.plateau), unmeasured: false };
  }
  if (!("plateau" in reading)) return null;
  const { plateau, kind } = reading;
  return { value: plateau, text: pressureText(plateau, limits.plateau), unmeasured: kind === "unmeasured" };
}
