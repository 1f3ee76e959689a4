import type { State } from "@/lib/protocol/result";

interface TrackMarkerProps {
  x: number;
  /** Where the tether of a value outside begins, px; null inside. */
  nearestPost: number | null;
  state: State;
  lastState: State | null;
}

const y = 10;

/** Disc inside, half disc at the edge, tethered diamond outside, dashed ring or dashed diamond where not measured. */
export function TrackMarker({ x, nearestPost, state, lastState }: TrackMarkerProps) {
  const halo = { stroke: "var(--paper)", strokeWidth: 1.5 };
  switch (state) {
    case "inside":
      return <circle data-shape="disc" cx={x} cy={y} r="6" fill="var(--accent)" {...halo} />;
    case "edge":
      return <HalfDisc x={x} />;
    case "outside":
      return (
        <g>
          {nearestPost !== null && <Tether from={nearestPost} to={x} />}
          <path data-shape="diamond" d={diamond(x, 7.75)} fill="var(--outside)" {...halo} />
        </g>
      );
    case "unmeasured":
      return lastState === "outside" ? (
        <g>
          {nearestPost !== null && <Tether from={nearestPost} to={x} dashed />}
          <path
            data-shape="dashed-diamond"
            d={diamond(x, 6)}
            fill="var(--paper)"
            stroke="var(--outside)"
            strokeWidth="1.6"
            strokeDasharray="2.6 1.7"
          />
        </g>
      ) : (
        <circle
          data-shape="dashed-ring"
          cx={x}
          cy={y}
          r="5"
          fill="var(--paper)"
          stroke="var(--unm)"
          strokeWidth="1.6"
          strokeDasharray="2.6 1.9"
        />
      );
    case "not-asked":
      return null;
  }
}

function HalfDisc({ x }: { x: number }) {
  return (
    <g data-shape="half-disc" data-x={x}>
      <circle cx={x} cy={y} r="6.5" fill="var(--paper)" stroke="var(--edge)" strokeWidth="1.5" />
      <path d={`M${x} ${y - 6.5}A6.5 6.5 0 0 0 ${x} ${y + 6.5}Z`} fill="var(--edge)" />
    </g>
  );
}

function Tether({ from, to, dashed = false }: { from: number; to: number; dashed?: boolean }) {
  return (
    <path
      data-part="tether"
      d={`M${from} ${y}H${to}`}
      stroke="var(--outside)"
      strokeWidth={dashed ? 1.6 : 3.5}
      strokeDasharray={dashed ? "2.6 1.7" : undefined}
    />
  );
}

/** Sides of 11 px are 7.75 px from middle to corner. */
function diamond(x: number, half: number): string {
  return `M${x} ${y - half}L${x + half} ${y}L${x} ${y + half}L${x - half} ${y}Z`;
}
