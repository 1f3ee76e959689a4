import { timeOfDay } from "@/lib/format";

interface NotRefreshedProps {
  failing: boolean;
  /** When the server made what is shown. */
  at: string;
  now: number;
  timeZone: string;
}

const toldAfterMs = 45_000;

/** Says that what is shown is no longer kept fresh, and as of when it is true. */
export function NotRefreshed({ failing, at, now, timeZone }: NotRefreshedProps) {
  const told = failing && now - Date.parse(at) > toldAfterMs;
  return (
    <div role="status">
      {told && (
        <p className="border-b border-hair bg-unm-soft page-margin py-2 t-body">
          <b>Not refreshed.</b> This is what was charted by {timeOfDay({ at, timeZone })}. Trying again; check the
          network.
        </p>
      )}
    </div>
  );
}
