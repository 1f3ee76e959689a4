"use client";

import { dayAndDate, timeOfDay } from "@/lib/format";
import { useEffect, useState } from "react";

export interface UnitClockProps {
  /** IANA zone of the unit: the clock on the wall there, wherever this screen is. */
  timeZone: string;
  /** The server's moment when the page was made, ISO 8601; the clock runs on from it. */
  now: string;
}

/** Date and time in the unit's zone; a device clock that is off does not move it. */
export function UnitClock({ timeZone, now }: UnitClockProps) {
  const at = useRunningClock(now);
  return (
    <time dateTime={at.toISOString().slice(0, 16) + "Z"} className="inline-flex items-baseline gap-2 whitespace-nowrap">
      <span className="hidden text-[15px] text-muted tablet:inline">{dayAndDate({ at, timeZone })}</span>
      <span className="n-clock text-ink">{timeOfDay({ at, timeZone })}</span>
    </time>
  );
}

function useRunningClock(startIso: string): Date {
  const [elapsedMs, setElapsedMs] = useState(0);
  useEffect(() => {
    const started = performance.now();
    const timer = setInterval(() => setElapsedMs(performance.now() - started), 5000);
    return () => clearInterval(timer);
  }, [startIso]);
  return new Date(new Date(startIso).getTime() + elapsedMs);
}
