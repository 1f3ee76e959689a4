/** Low and high water of 23 tides from spring to neap, and the mark that the last of them stay under. */
const mark = 65;
const foot = 460;
const tides: [high: number, low: number][] = [
  [0, 330],
  [11, 336],
  [22, 338],
  [31, 334],
  [38, 326],
  [42, 317],
  [45, 303],
  [49, 291],
  [53, 280],
  [61, 272],
  [73, 266],
  [87, 265],
  [103, 266],
  [118, 268],
  [132, 268],
  [141, 266],
  [147, 261],
  [147, 253],
  [145, 243],
  [143, 234],
  [140, 227],
  [138, 223],
  [140, 224],
];

/** Decoration: the tide with the smallest rise. Says nothing about a patient. */
export function NeapDrawing({ className = "" }: { className?: string }) {
  return (
    <svg viewBox={`0 0 708 ${foot}`} aria-hidden="true" className={`block w-full ${className}`}>
      {tides.map(([high, low], index) => {
        const x = 28 + index * 29;
        return (
          <g key={x}>
            {high < mark - 2 && <rect x={x} y={high} width="16" height={mark - 2 - high} fill="var(--accent)" />}
            <rect
              x={x}
              y={Math.max(high, mark + 2)}
              width="16"
              height={low - 1 - Math.max(high, mark + 2)}
              fill="var(--accent)"
            />
            <rect x={x} y={low + 3} width="16" height={foot - low - 3} fill="var(--band)" />
          </g>
        );
      })}
      <path d={`M0 ${mark}H708`} stroke="var(--ink)" strokeWidth="1.6" strokeDasharray="6 4" />
    </svg>
  );
}
