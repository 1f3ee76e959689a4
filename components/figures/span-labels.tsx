import { placeLabels } from "./place-labels";
import type { SpanMetrics } from "./span-metrics";
import type { SpanLabel } from "./span-label-lines";
import { SvgNumber } from "./svg-number";

const looks = {
  number: { fontSize: 30, fontWeight: 700, fill: "var(--ink)" },
  word: { fontSize: 15, fontWeight: 400, fill: "var(--ink)" },
  quiet: { fontSize: 15, fontWeight: 400, fill: "var(--muted)" },
  age: { fontSize: 14, fontWeight: 400, fill: "var(--muted)" },
  limit: { fontSize: 15, fontWeight: 660, fill: "var(--ink)" },
  unmeasured: { fontSize: 15, fontWeight: 640, fill: "var(--unm)" },
  was: { fontSize: 15, fontWeight: 400, fill: "var(--unm)" },
  inside: { fontSize: 15, fontWeight: 640, fill: "var(--accent)" },
  edge: { fontSize: 15, fontWeight: 640, fill: "var(--edge)" },
  outside: { fontSize: 15, fontWeight: 640, fill: "var(--outside)" },
};

/** The words right of the column, each below its line, moved apart where they would overlap. */
export function SpanLabels({ metrics, labels }: { metrics: SpanMetrics; labels: SpanLabel[] }) {
  const { column, y, labelX, height } = metrics;
  const wanted = labels.map((label) => ({ ...label, top: y(label.at) + label.offset }));
  return (
    <g>
      {placeLabels(wanted, height).map((label) => (
        <g key={label.part} data-label={label.part} data-top={label.top} data-height={label.height}>
          {Math.abs(label.top - y(label.at) - label.offset) > 10 && (
            <path
              d={`M${column.right + 8} ${y(label.at)}L${labelX - 2} ${label.top + label.height / 2}`}
              stroke="var(--rule)"
            />
          )}
          {label.lines.map((line) => (
            <Line key={line.text} line={line} x={labelX} y={label.top + line.baseline} />
          ))}
        </g>
      ))}
    </g>
  );
}

function Line({ line, x, y }: { line: SpanLabel["lines"][number]; x: number; y: number }) {
  if (line.look === "number") return <SvgNumber x={x} y={y} text={line.text} {...looks.number} />;
  return (
    <text x={x} y={y} {...looks[line.look]} className="font-words">
      {line.text}
      {line.number !== undefined && (
        <tspan dx="4" fontSize="17" fontWeight="700" fill="var(--ink)" className="nums">
          {line.number}
        </tspan>
      )}
    </text>
  );
}
