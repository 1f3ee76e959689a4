import type { ReactNode } from "react";
import { describeLadder } from "./describe-ladder";
import { LadderFlag } from "./ladder-flag";
import { LadderLabels } from "./ladder-labels";
import { LadderMarker } from "./ladder-marker";
import { ladderMetrics } from "./ladder-metrics";
import { LadderRails } from "./ladder-rails";
import type { VolumeLadderProps } from "./ladder-reading";
import { ladderRungs } from "./ladder-rungs";

/**
 * This patient's millilitres at each mL/kg PBW, between two rails; shaded where ordered. Stretches to its container.
 * Without a PBW there is no ladder: `action` is the button that leads to measuring height.
 */
export function VolumeLadder({ action, ...ladder }: VolumeLadderProps & { action?: ReactNode }) {
  const { size = "full", pbwKg, order, reading, note } = ladder;
  if (pbwKg === null) return <NoHeight action={action} />;
  const metrics = ladderMetrics(size);
  const rungs = ladderRungs({ pbwKg, order, labelRoom: metrics.labelRoom });
  return (
    <div className={metrics.insetClass}>
      <svg
        role="img"
        aria-label={describeLadder({ ...ladder, pbwKg })}
        width="100%"
        height={metrics.height}
        overflow="visible"
        className="block overflow-visible"
      >
        <LadderRails metrics={metrics} rungs={rungs} order={order} />
        {reading && <LadderMarker metrics={metrics} reading={reading} order={order} />}
        <LadderLabels metrics={metrics} rungs={rungs} />
        {reading && metrics.flag && <LadderFlag metrics={metrics} reading={reading} order={order} note={note} />}
      </svg>
    </div>
  );
}

function NoHeight({ action }: { action?: ReactNode }) {
  return (
    <div className="flex flex-wrap items-center gap-4 py-3">
      <p className="t-body text-unm">Measure height to see millilitres</p>
      {action}
    </div>
  );
}
