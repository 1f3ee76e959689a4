import type { State } from "@/lib/protocol/result";

export interface StateShapeProps {
  state: State;
  /** Last outside and not measured since: the outside shape, dashed. */
  lastOutside?: boolean;
}

/** The shape of a state beside its word: disc, half disc, diamond, dashed ring. Says nothing by itself. */
export function StateShape({ state, lastOutside = false }: StateShapeProps) {
  return (
    <svg width="14" height="14" viewBox="-7 -7 14 14" aria-hidden="true" className="inline-block shrink-0 self-center">
      <Shape state={lastOutside ? "last-outside" : state} />
    </svg>
  );
}

function Shape({ state }: { state: State | "last-outside" }) {
  switch (state) {
    case "inside":
      return <circle data-shape="disc" r="5" fill="var(--accent)" />;
    case "edge":
      return (
        <g data-shape="half-disc" stroke="var(--edge)" strokeWidth="1.5">
          <circle r="5" fill="none" />
          <path d="M0-5A5 5 0 0 0 0 5Z" fill="var(--edge)" stroke="none" />
        </g>
      );
    case "outside":
      return <path data-shape="diamond" d="M0-6L6 0L0 6L-6 0Z" fill="var(--outside)" />;
    case "last-outside":
      return (
        <path
          data-shape="dashed-diamond"
          d="M0-5.5L5.5 0L0 5.5L-5.5 0Z"
          fill="none"
          stroke="var(--outside)"
          strokeWidth="1.6"
          strokeDasharray="2.4 1.6"
        />
      );
    case "unmeasured":
      return (
        <circle
          data-shape="dashed-ring"
          r="4.8"
          fill="none"
          stroke="var(--unm)"
          strokeWidth="1.6"
          strokeDasharray="2.4 1.9"
        />
      );
    case "not-asked":
      return <path data-shape="dash" d="M-4 0H4" stroke="var(--muted)" strokeWidth="1.5" />;
  }
}
