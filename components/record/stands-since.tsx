import { timeOfDay } from "@/lib/format";
import { Notice } from "./notice";
import type { Pending } from "./pending-facts";
import { settingValueWords, settingWords } from "./setting-words";
import { useRecord } from "./use-record";

/** After a save: settings that somebody charted for a later time stand, so this entry fills history and no more. */
export function StandsSince({ pending }: { pending: Pending }) {
  const { worksheet } = useRecord();
  const { settings, unit } = worksheet;
  const sent = pending.entry.route === "bedside-entries" ? (pending.entry.body.settings ?? {}) : {};
  const later = Object.keys(sent).flatMap((field) => {
    const inForce = settings?.[field];
    const isLater = inForce && Date.parse(inForce.chartedAt) > Date.parse(pending.filled.chartedAt);
    return isLater && !pending.entryIds.includes(inForce.entryId) ? [{ field, inForce }] : [];
  });
  if (later.length === 0 || pending.undo === "done") return null;
  return (
    <Notice>
      {later.map(({ field, inForce }) => (
        <span key={field} className="block">
          {settingWords(field)} {settingValueWords(field, inForce.value as number | string)}, charted by{" "}
          {inForce.author.name} for {timeOfDay({ at: inForce.chartedAt, timeZone: unit.timeZone })}, is in force. Yours
          stands before it. Check the ventilator.
        </span>
      ))}
    </Notice>
  );
}
