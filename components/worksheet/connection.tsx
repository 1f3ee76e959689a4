import { NotRefreshed } from "@/components/shell/not-refreshed";
import { useDeviceClockOffMinutes } from "@/lib/client/server-clock";
import type { Worksheet } from "@/lib/contracts";

/** Says when what is shown could not be refreshed, and when this device's clock is off. */
export function Connection({ sheet, failing, now }: { sheet: Worksheet; failing: boolean; now: number }) {
  const clockOff = useDeviceClockOffMinutes();
  return (
    <>
      <NotRefreshed failing={failing} at={sheet.at} now={now} timeZone={sheet.unit.timeZone} />
      {clockOff !== 0 && (
        <p role="status" className="border-b border-hair bg-edge-soft page-margin py-2 t-body">
          This device’s clock is {Math.abs(clockOff)} min {clockOff > 0 ? "ahead of" : "behind"} the server. Times here
          follow the server.
        </p>
      )}
    </>
  );
}
